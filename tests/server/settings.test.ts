import { describe, expect, it } from 'vitest';
import { readSettings } from '#server/settings.ts';

const database = { DATABASE_URL: 'postgres://somewhere' };

describe('settings that cannot be right are refused in plain words', () => {
  it('a server without a database does not start', () => {
    expect(() => readSettings({})).toThrow('DATABASE_URL must name a PostgreSQL database');
  });

  it.each(['abc', '-1', '1.5'])('a port of %s is refused by name', (port) => {
    expect(() => readSettings({ ...database, PORT: port })).toThrow(
      `PORT must be a whole number, 0 or more; it is "${port}"`,
    );
  });

  it.each(['gowns.example', 'ftp://gowns.example'])('a public address of %s', (publicUrl) => {
    expect(() => readSettings({ ...database, PUBLIC_URL: publicUrl })).toThrow(
      'PUBLIC_URL must be an address such as https://gowns.example',
    );
  });
});

describe('settings have plain defaults', () => {
  it('loopback, 4173 and no https', () => {
    const settings = readSettings(database);
    expect(settings).toMatchObject({ host: '127.0.0.1', port: 4173, overHttps: false });
  });

  it('a public address over https is told to browsers', () => {
    const settings = readSettings({ ...database, PUBLIC_URL: 'https://gowns.example' });
    expect(settings.overHttps).toBe(true);
  });
});
