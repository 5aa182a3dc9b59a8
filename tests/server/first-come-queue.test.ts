import { setTimeout as pause } from 'node:timers/promises';
import { describe, expect, it } from 'vitest';
import { firstComeQueue, type Line } from '#server/http/first-come-queue.ts';
import { RefusalError } from '#server/http/refusal.ts';

const open = (line: Partial<Line> = {}) =>
  firstComeQueue({
    waiting: 10,
    fromOne: 10,
    busy: 'Many people are printing.',
    retryAfterSeconds: 5,
    ...line,
  });
const staying = new AbortController().signal;
const judith = { from: 'judith', gone: staying };
const lotte = { from: 'lotte', gone: staying };

describe('works are done one after the other', () => {
  it('in the order they were asked for, however long each takes', async () => {
    const queue = open();
    const done: number[] = [];
    const works = [30, 1, 15, 0].map((ms, index) =>
      queue(judith, async () => {
        await pause(ms);
        done.push(index);
      }),
    );
    await Promise.all(works);
    expect(done).toEqual([0, 1, 2, 3]);
  });

  it('one that fails does not hold up the next', async () => {
    const queue = open();
    const failed = queue(judith, () => Promise.reject(new Error('no paper')));
    const next = queue(judith, () => Promise.resolve('printed'));
    await expect(failed).rejects.toThrow('no paper');
    await expect(next).resolves.toBe('printed');
  });

  it('who finds the line full is sent away with a time to come back, and room opens again', async () => {
    const queue = open({ waiting: 1 });
    const first = queue(judith, () => pause(20));
    const second = queue(judith, () => pause(1));
    const third = queue(lotte, () => pause(1));
    await expect(third).rejects.toBeInstanceOf(RefusalError);
    await expect(third).rejects.toMatchObject({ code: 'busy', details: { retryAfterSeconds: 5 } });
    await Promise.all([first, second]);
    await expect(queue(lotte, () => Promise.resolve('printed'))).resolves.toBe('printed');
  });

  it('one address has so many places and no more, and leaves the others theirs', async () => {
    const queue = open({ fromOne: 2 });
    const hers = [queue(judith, () => pause(10)), queue(judith, () => pause(1))];
    await expect(queue(judith, () => pause(1))).rejects.toMatchObject({ code: 'busy' });
    await expect(queue(lotte, () => Promise.resolve('printed'))).resolves.toBe('printed');
    await Promise.all(hers);
    await expect(queue(judith, () => Promise.resolve('printed'))).resolves.toBe('printed');
  });

  it('who leaves gives the place free at once, and nothing is done for nobody', async () => {
    const queue = open({ waiting: 1 });
    const leaving = new AbortController();
    const first = queue(judith, () => pause(30));
    let done = false;
    const left = queue({ from: 'bridget', gone: leaving.signal }, () => {
      done = true;
      return Promise.resolve();
    });
    leaving.abort();
    await expect(left).rejects.toBeInstanceOf(RefusalError);
    await expect(queue(lotte, () => Promise.resolve('printed'))).resolves.toBe('printed');
    await first;
    expect(done).toBe(false);
    const late = queue({ from: 'bridget', gone: leaving.signal }, () => pause(0));
    await expect(late).rejects.toMatchObject({ code: 'busy' });
  });
});
