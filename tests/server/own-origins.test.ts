import { describe, expect, it } from 'vitest';
import { isOnThisMachineAlone, ownOrigins } from '#server/http/own-origins.ts';

const at = (host: string, publicUrl?: string) => ({ host, publicUrl, port: 4173 });

describe('pages that are ours', () => {
  it('are those of every name of this machine on loopback', () => {
    const all = ['http://localhost:4173', 'http://127.0.0.1:4173', 'http://[::1]:4173'];
    for (const host of ['127.0.0.1', 'localhost', '::1']) expect(ownOrigins(at(host))).toEqual(all);
    expect(ownOrigins(at('0.0.0.0', 'http://localhost:4173/'))).toEqual(all);
  });

  it('are those of the public address alone, where there is one', () => {
    const behind = at('127.0.0.1', 'https://gowns.example/');
    expect(ownOrigins(behind)).toEqual(['https://gowns.example']);
  });

  it('are those of the host without a public address', () => {
    expect(ownOrigins(at('workroom'))).toContain('http://workroom:4173');
  });
});

describe('a page at the port every browser leaves out', () => {
  it('is told as browsers tell it', () => {
    expect(ownOrigins({ ...at('workroom'), port: 80 })).toContain('http://workroom');
    expect(ownOrigins({ ...at('127.0.0.1'), port: 80 })).toContain('http://localhost');
    expect(ownOrigins(at('127.0.0.1', 'https://Gowns.example:443/'))).toEqual([
      'https://gowns.example',
    ]);
  });
});

describe('the demo account', () => {
  it('is closed where a proxy on this machine may let others in', () => {
    const behind = { ...at('127.0.0.1'), trustedProxies: 1 };
    expect(isOnThisMachineAlone(behind)).toBe(false);
  });

  it.each([
    [at('127.0.0.1'), true],
    [at('localhost', 'http://127.0.0.1:4173'), true],
    [at('0.0.0.0'), false],
    [at('127.0.0.1', 'https://gowns.example'), false],
    [at('127.0.0.1.elsewhere.example'), false],
  ])('%o: only where nobody else can come by (%s)', (address, alone) => {
    expect(isOnThisMachineAlone({ ...address, trustedProxies: 0 })).toBe(alone);
  });
});
