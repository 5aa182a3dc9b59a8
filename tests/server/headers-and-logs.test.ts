import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { card, post, print } from './support/request-bodies.ts';
import { type ServerUnderTest, startServer } from './support/server-under-test.ts';

let server: ServerUnderTest;
beforeAll(async () => {
  server = await startServer();
});
afterAll(() => server.close());

describe('every reply tells the browser what it may not do', () => {
  it.each(['/api/samples', '/api/nothing', '/nothing'])('%s', async (path) => {
    const { headers } = await fetch(`${server.address}${path}`);
    const policy = headers.get('content-security-policy') ?? '';
    expect(policy).toContain("default-src 'none'");
    expect(policy).toContain("script-src 'self'");
    expect(policy).not.toContain('unsafe');
    expect(policy).toContain("frame-ancestors 'none'");
    expect(headers.get('x-content-type-options')).toBe('nosniff');
    expect(headers.get('referrer-policy')).toBe('no-referrer');
    expect(headers.get('permissions-policy')).toMatch(/camera=\(\).*geolocation=\(\)/);
    expect(headers.get('x-powered-by')).toBeNull();
    expect(headers.get('x-request-id')).toMatch(/^[0-9a-f-]{36}$/);
  });

  it('to stay with https only where people come over https', async () => {
    const plain = await fetch(`${server.address}/api/samples`);
    expect(plain.headers.get('strict-transport-security')).toBeNull();
    const secure = await startServer({ overHttps: true });
    const reply = await fetch(`${secure.address}/api/samples`);
    await secure.close();
    expect(reply.headers.get('strict-transport-security')).toContain('max-age=');
  });
});

describe('the log', () => {
  it('tells of every request and of nobody', async () => {
    await post(`${server.address}/api/prints/tiles?note=Hazel`, print);
    await post(`${server.address}/api/drafts`, { card: { ...card, bustGirth: 92.5 } });
    await post(`${server.address}/api/drafts`, '{"card": {"name": "Judith');
    await fetch(`${server.address}/api/clients/Judith`);
    const lines = server.logged();
    expect(lines).toContain('"route":"/api/prints/tiles"');
    expect(lines).toContain('"status":422');
    expect(lines).toContain('"status":400');
    for (const secret of ['Judith', 'Amsel', 'Hazel', '92.5', '2026-10-12', '127.0.0.1', '::1']) {
      expect(lines).not.toContain(secret);
    }
  });
});

describe('the health route', () => {
  it('asks the database', async () => {
    const reply = await fetch(`${server.address}/api/health`);
    expect(await reply.json()).toEqual({ name: 'ellwand', database: 'answers' });
  });
});
