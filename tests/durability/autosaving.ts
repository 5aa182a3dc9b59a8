import { randomUUID } from 'node:crypto';
import { setTimeout as pause } from 'node:timers/promises';
import { signUp } from '#shared/api/accounts.ts';
import { addressOf, type Endpoint } from '#shared/api/endpoint.ts';
import { createGown, saveGown } from '#shared/api/gowns.ts';
import { saved } from '#shared/api/saving.ts';
import { engineVersion } from '#shared/engine/draft-gown.ts';
import { content, password } from '../server/support/maker.ts';
import type { Acknowledgement, Word } from './ledger.ts';
import { seeded } from './seeded.ts';

/** A browser that saves and saves; a process of its own, so that nothing it waits for holds it up. */
const [address = '', seed = '', saves = '', gowns = ''] = process.argv.slice(2);
const chance = seeded(Number(seed));
const each = Math.ceil(Number(saves) / Number(gowns));

let cookie = '';
let retries = 0;
let unheard = 0;
const acknowledged: Acknowledgement[] = [];
const refused: string[] = [];

const tell = (word: Word) => process.send?.(word);

async function sendOnce(line: Endpoint, body: object, gownId: string): Promise<Response> {
  const reply = await fetch(`${address}${addressOf(line, { gownId })}`, {
    method: 'POST',
    headers: { 'content-type': 'application/json', origin: address, cookie },
    body: JSON.stringify(body),
    signal: AbortSignal.timeout(5000),
  });
  const given = reply.headers.getSetCookie().map((set) => set.split(';')[0] ?? '');
  if (given.length > 0) cookie = given.join('; ');
  return reply;
}

/** Sends the same until it is answered, as a browser does that has kept it. */
async function send(
  line: Endpoint,
  body: object,
  gownId = '',
): Promise<{ readonly told: unknown; readonly sentAt: number } | undefined> {
  for (;;) {
    const sentAt = Date.now();
    try {
      const reply = await sendOnce(line, body, gownId);
      const told: unknown = await reply.json();
      if (reply.ok) return { told, sentAt };
      if (reply.status < 500) {
        refused.push(`${reply.status} ${JSON.stringify(told).slice(0, 200)}`);
        return undefined;
      }
    } catch (error) {
      if (!(error instanceof Error)) throw error;
    }
    retries += 1;
    await pause(20 + 200 * chance());
  }
}

async function autosave(gownId: string): Promise<void> {
  let version = 1;
  for (let count = 1; count <= each; count += 1) {
    const saveId = randomUUID();
    const change = { waistGirth: 700 + (count % 60), typed: { 'card.name': `save ${count}` } };
    const body = {
      saveId,
      baseVersion: version,
      engine: engineVersion,
      content: content(change),
    };
    const answer = await send(saveGown, body, gownId);
    if (answer === undefined) return;
    const told = saved.parse(answer.told);
    if (Date.parse(told.savedAt) < answer.sentAt) unheard += 1;
    version = told.version;
    acknowledged.push({ gownId, saveId, version, count });
    tell({ acknowledged: acknowledged.length });
  }
}

await sendOnce(signUp, { email: 'autosaving@workroom.example', password }, '');
const made: string[] = [];
for (let i = 1; i <= Number(gowns); i += 1) {
  const body = { saveId: randomUUID(), title: `Gown ${i}`, content: content() };
  const answer = createGown.reply.schema.parse((await send(createGown, body))?.told);
  made.push(answer.id);
}
tell({ acknowledged: 0 });
await Promise.all(made.map(autosave));
tell({ ledger: { acknowledged, retries, unheard, refused } });
process.disconnect();
