import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';

import { gownSchema, type Gown, type GownContent } from '#shared/api/gowns.ts';
import { balanced } from '#shared/drafting/house-rule-presets.ts';

import { sameWork } from '../../../../src/features/drafting-table/gown-content.ts';
import { openSaver, type Unsent } from '../../../../src/features/drafting-table/saver.ts';
import { CallFailed } from '../../../../src/lib/call.ts';

const contentAs = (name: string): GownContent => ({
  typed: { unit: 'cm', fields: { 'card.name': name } },
  unread: [],
  inputs: { card: { name }, style: {}, rules: balanced },
});

const gownAs = (name: string, version: number): Gown => ({
  id: '00000000-0000-4000-8000-000000000000',
  title: 'Gown',
  version,
  archived: false,
  createdAt: '2026-11-14T09:30:00.000Z',
  savedAt: '2026-11-14T09:30:00.000Z',
  drawnBy: null,
  fresh: false,
  content: contentAs(name),
  drawn: null,
  lastSave: { savedAt: '2026-11-14T09:30:00.000Z', device: 'Firefox on Linux', here: false },
  redrawing: null,
  personId: null,
  cardId: null,
});

beforeEach(() => vi.useFakeTimers());
afterEach(() => vi.useRealTimers());

/** A table with a saver, and a server that answers as told, one answer a save. */
function workroom(answers: readonly (number | CallFailed)[], start: Partial<Gown> = {}) {
  const table = { name: 'as opened' };
  const sent: Unsent<GownContent>[] = [];
  const waiting = [...answers];
  const saver = openSaver({
    base: start.version ?? 1,
    unsent: undefined,
    changed: false,
    engine: '1.0.0',
    readCurrent: (current) => gownSchema.safeParse(current).data,
    same: sameWork,
    content: () => contentAs(table.name),
    send: (save) => {
      sent.push(save);
      const answer = waiting.shift();
      if (typeof answer === 'number') return Promise.resolve({ version: answer });
      return Promise.reject(answer ?? new Error('a save nobody expected'));
    },
  });
  const edit = (name: string) => {
    table.name = name;
    saver.edited();
  };
  return { saver, sent, edit };
}

const pass = (ms: number) => vi.advanceTimersByTimeAsync(ms);

describe('saving by itself', () => {
  it('waits until the hand rests, then saves once from the version before', async () => {
    const { saver, sent, edit } = workroom([2]);
    edit('a');
    await pass(400);
    edit('ab');
    expect(saver.now().standing).toBe('waiting');
    await pass(699);
    expect(sent).toEqual([]);
    await pass(1);
    expect(sent).toMatchObject([{ baseVersion: 1, content: contentAs('ab') }]);
    expect(saver.now()).toMatchObject({ standing: 'saved', base: 2 });
  });

  it('does not wait longer than three seconds for a hand that never rests', async () => {
    const { sent, edit } = workroom([2, 3]);
    for (let letter = 0; letter < 8; letter += 1) {
      edit(String(letter));
      await pass(400);
    }
    expect(sent).toHaveLength(1);
  });

  it('sends nothing where the work is as it was', async () => {
    const { saver, sent, edit } = workroom([]);
    edit('b');
    edit('as opened');
    await pass(1000);
    expect(sent).toEqual([]);
    expect(saver.now().standing).toBe('saved');
  });

  it('sends the same save with the same number until it is acknowledged, then what came after', async () => {
    const gone = new CallFailed('offline', 'The server cannot be reached.');
    const busy = new CallFailed('unavailable', 'The database does not answer.');
    const { saver, sent, edit } = workroom([gone, busy, 2, 3]);
    edit('a');
    await pass(700);
    expect(saver.now().standing).toBe('offline');
    edit('b');
    await pass(1000);
    await pass(2000);
    expect(sent.map(({ saveId }) => saveId).slice(0, 3)).toEqual(
      Array.from({ length: 3 }, () => sent[0]?.saveId),
    );
    expect(sent.at(2)?.content).toEqual(contentAs('a'));
    expect(sent.at(3)).toMatchObject({ baseVersion: 2, content: contentAs('b') });
    expect(saver.now()).toMatchObject({ standing: 'saved', base: 3 });
  });

  it('waits for a sign-in, and sends the same save afterwards', async () => {
    const { saver, sent, edit } = workroom([new CallFailed('not-signed-in', 'Sign in.'), 2]);
    edit('a');
    await pass(700);
    expect(saver.now().standing).toBe('signed-out');
    await pass(60_000);
    expect(sent).toHaveLength(1);
    await saver.flush();
    expect(sent[1]?.saveId).toBe(sent[0]?.saveId);
    expect(saver.now().standing).toBe('saved');
  });

  it('stops at a conflict until the maker has chosen, and keeps hers over what the server then keeps too', async () => {
    const conflict = new CallFailed('conflict', 'Saved meanwhile.', [], gownAs('theirs', 7));
    const { saver, sent, edit } = workroom([conflict, 8]);
    edit('mine');
    await pass(700);
    expect(saver.now()).toMatchObject({ standing: 'conflict', current: { version: 7 } });
    edit('mine, still');
    await pass(60_000);
    expect(sent).toHaveLength(1);
    saver.keepMine();
    await pass(0);
    expect(sent[1]).toMatchObject({
      baseVersion: 7,
      keepReplaced: true,
      content: contentAs('mine, still'),
    });
    expect(sent[1]?.saveId).not.toBe(sent[0]?.saveId);
    expect(saver.now()).toMatchObject({ standing: 'saved', base: 8 });
  });

  it('takes the other side’s work without saving it again', async () => {
    const conflict = new CallFailed('conflict', 'Saved meanwhile.', [], gownAs('theirs', 7));
    const { saver, sent, edit } = workroom([conflict]);
    edit('mine');
    await pass(700);
    saver.adopt(7, contentAs('theirs'));
    edit('theirs');
    await pass(1000);
    expect(sent).toHaveLength(1);
    expect(saver.now()).toMatchObject({ standing: 'saved', base: 7 });
  });

  it('asks nobody where both sides drew the same', async () => {
    const conflict = new CallFailed('conflict', 'Saved meanwhile.', [], gownAs('mine', 7));
    const { saver, edit } = workroom([conflict]);
    edit('mine');
    await pass(700);
    expect(saver.now()).toMatchObject({ standing: 'saved', base: 7 });
  });

  it('says why a save was refused, and tries again with the next change', async () => {
    const { saver, edit } = workroom([new CallFailed('too-large', 'Too much.'), 2]);
    edit('a');
    await pass(700);
    expect(saver.now()).toMatchObject({ standing: 'refused', message: 'Too much.' });
    edit('b');
    await pass(700);
    expect(saver.now().standing).toBe('saved');
  });
});
