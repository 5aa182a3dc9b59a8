import { setTimeout as pause } from 'node:timers/promises';
import { describe, expect, it } from 'vitest';
import { firstComeQueue } from '#server/http/first-come-queue.ts';
import { RefusalError } from '#server/http/refusal.ts';

describe('prints are made one after the other', () => {
  it('in the order they were asked for, however long each takes', async () => {
    const queue = firstComeQueue(10);
    const done: number[] = [];
    const works = [30, 1, 15, 0].map((ms, index) =>
      queue(async () => {
        await pause(ms);
        done.push(index);
      }),
    );
    await Promise.all(works);
    expect(done).toEqual([0, 1, 2, 3]);
  });

  it('one that fails does not hold up the next', async () => {
    const queue = firstComeQueue(10);
    const failed = queue(() => Promise.reject(new Error('no paper')));
    const next = queue(() => Promise.resolve('printed'));
    await expect(failed).rejects.toThrow('no paper');
    await expect(next).resolves.toBe('printed');
  });

  it('who finds the line full is sent away with a time to come back, and room opens again', async () => {
    const queue = firstComeQueue(1);
    const first = queue(() => pause(20));
    const second = queue(() => pause(1));
    const third = queue(() => pause(1));
    await expect(third).rejects.toBeInstanceOf(RefusalError);
    await expect(third).rejects.toMatchObject({ code: 'busy', details: { retryAfterSeconds: 5 } });
    await Promise.all([first, second]);
    await expect(queue(() => Promise.resolve('printed'))).resolves.toBe('printed');
  });
});
