import { spawn } from 'node:child_process';
import { createHash } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it, vi } from 'vitest';
import {
  followClass,
  listClasses,
  openClass,
  turnClass,
  visitClass,
  withdrawClass,
} from '#shared/api/classes.ts';
import { saveGown } from '#shared/api/gowns.ts';
import { draftAny } from '#shared/engine/drafted.ts';
import { freePort } from '#server/ops/free-port.mjs';
import { whoAnswers } from '#server/ops/server-process.mjs';
import { type Browser, openBrowser, openMaker } from './support/maker.ts';
import { ask } from './support/question.ts';
import { card } from './support/request-bodies.ts';
import { newGown, save } from './support/saved-gown.ts';
import { type ServerUnderTest, startServer } from './support/server-under-test.ts';

let server: ServerUnderTest;
let tutor: Browser & { readonly email: string };
let gown: { readonly gownId: string };
const wish = { title: 'Tuesday class', step: 'front/bust-line', unit: 'in', hours: 2 } as const;

beforeAll(async () => {
  server = await startServer();
  tutor = await openMaker(server.address);
  gown = await newGown(tutor);
});
afterAll(() => server.close());

describe('a class', () => {
  it('is seen by whoever has the link, without an account, and can be drawn from what it shows', async () => {
    const { token, expiresAt } = await tutor.call(openClass, wish, gown);
    const visitor = openBrowser(server.address);
    const seen = await visitor.call(visitClass, undefined, { token });
    expect(seen.title).toBe('Tuesday class');
    expect(seen.unit).toBe('in');
    expect(seen.step).toBe('front/bust-line');
    expect(seen.expiresAt).toBe(expiresAt);
    const hours = (Date.parse(expiresAt) - Date.now()) / 3_600_000;
    expect(hours).toBeGreaterThan(1.98);
    expect(hours).toBeLessThanOrEqual(2);
    const draft = draftAny(seen.inputs);
    expect(draft.body.measures.bustGirth).toBe(card.bustGirth);
    expect(visitor.cookie()).toBe('');
  });

  it('shows no name, no day, no address and no gown of the tutor’s', async () => {
    const { token } = await tutor.call(openClass, wish, gown);
    const visitor = openBrowser(server.address);
    const reply = await visitor.send(visitClass, undefined, { token });
    const text = await reply.text();
    expect(reply.headers.get('cache-control')).toBe('no-store');
    for (const secret of ['Judith', 'Amsel', '2026-10-12', tutor.email, 'Gala', gown.gownId]) {
      expect(text).not.toContain(secret);
    }
    const rows = await ask(server.databaseUrl, 'select inputs::text as inputs from classes');
    for (const { inputs } of rows) expect(inputs).not.toMatch(/Judith|2026-10-12/);
  });

  it('is kept by a digest of its link alone, and the link is not logged', async () => {
    const { id, token } = await tutor.call(openClass, wish, gown);
    await openBrowser(server.address).call(visitClass, undefined, { token });
    const [row] = await ask(server.databaseUrl, 'select * from classes where id = $1', [id]);
    expect(row?.['digest']).toBe(createHash('sha256').update(token).digest('hex'));
    expect(JSON.stringify(row)).not.toContain(token);
    expect(server.logged()).not.toContain(token);
    expect(token).toMatch(/^[\w-]{43}$/);
    const another = await tutor.call(openClass, wish, gown);
    expect(another.token).not.toBe(token);
  });

  it('turns with its tutor, and ends when she withdraws it', async () => {
    const { id, token } = await tutor.call(openClass, wish, gown);
    const visitor = openBrowser(server.address);
    const stands = async () => (await visitor.call(followClass, undefined, { token })).step;
    expect(await stands()).toBe('front/bust-line');
    await tutor.call(turnClass, { step: 'back/side-seam' }, { classId: id });
    expect(await stands()).toBe('back/side-seam');
    expect((await tutor.call(listClasses, undefined)).classes[0]).toMatchObject({
      id,
      gownId: gown.gownId,
      title: 'Tuesday class',
      step: 'back/side-seam',
    });
    await tutor.call(withdrawClass, undefined, { classId: id });
    await visitor.refused(404, followClass, undefined, { token });
    await visitor.refused(404, visitClass, undefined, { token });
  });

  it('stays as it was opened while the gown goes on', async () => {
    const own = await newGown(tutor);
    const { token } = await tutor.call(openClass, wish, own);
    await tutor.call(saveGown, save(1, { waistGirth: 700 }), own);
    const visitor = openBrowser(server.address);
    const { inputs } = await visitor.call(visitClass, undefined, { token });
    expect(inputs.card.waistGirth).toBe(card.waistGirth);
  });

  it.each([visitClass, followClass])(
    'that has run out is forgotten when somebody comes by its link ($path)',
    async (line) => {
      const { id, token } = await tutor.call(openClass, wish, gown);
      await ask(server.databaseUrl, 'update classes set expires_at = now() where id = $1', [id]);
      await openBrowser(server.address).refused(404, line, undefined, { token });
      expect(await ask(server.databaseUrl, 'select 1 from classes where id = $1', [id])).toEqual(
        [],
      );
    },
  );

  it('that has run out is forgotten when a server starts; an open one stays', async () => {
    const [gone, open] = [
      await tutor.call(openClass, wish, gown),
      await tutor.call(openClass, wish, gown),
    ];
    await ask(server.databaseUrl, 'update classes set expires_at = now() where id = $1', [gone.id]);
    const port = await freePort();
    const child = spawn(process.execPath, ['--import', 'tsx', 'server/index.ts'], {
      stdio: 'inherit',
      env: {
        ...process.env,
        LOG_LEVEL: 'warn',
        PORT: String(port),
        DATABASE_URL: server.databaseUrl,
      },
    });
    try {
      const answers = async () => (await whoAnswers(`http://127.0.0.1:${port}`)) === 'ellwand';
      await vi.waitUntil(answers, { timeout: 60_000, interval: 100 });
      const left = await ask(
        server.databaseUrl,
        'select id from classes where id = any($1::uuid[])',
        [[gone.id, open.id]],
      );
      expect(left).toEqual([{ id: open.id }]);
    } finally {
      child.kill('SIGKILL');
    }
  }, 90_000);

  it('that has run out is forgotten when the next one is opened', async () => {
    const { id } = await tutor.call(openClass, wish, gown);
    await ask(server.databaseUrl, 'update classes set expires_at = now() where id = $1', [id]);
    await tutor.call(openClass, wish, gown);
    expect(await ask(server.databaseUrl, 'select 1 from classes where id = $1', [id])).toEqual([]);
  });
});
