import { chromium, type CDPSession, type Page } from '@playwright/test';
import { preview } from 'vite';
import { z } from 'zod';

import { layOut } from './browser.ts';

const slowdown = 4;
const seconds = 5;

const traceEvent = z.object({
  name: z.string(),
  ph: z.string(),
  pid: z.number(),
  tid: z.number(),
  ts: z.number(),
  dur: z.number().optional(),
  tdur: z.number().optional(),
  args: z.unknown(),
});
type TraceEvent = z.output<typeof traceEvent>;

async function traced(devtools: CDPSession, act: () => Promise<void>): Promise<TraceEvent[]> {
  const events: TraceEvent[] = [];
  devtools.on('Tracing.dataCollected', ({ value }) => {
    events.push(...value.flatMap((each) => traceEvent.safeParse(each).data ?? []));
  });
  const categories = 'toplevel,devtools.timeline,disabled-by-default-devtools.timeline';
  await devtools.send('Tracing.start', { categories, transferMode: 'ReportEvents' });
  await act();
  const complete = new Promise((done) => devtools.once('Tracing.tracingComplete', done));
  await devtools.send('Tracing.end');
  await complete;
  return events;
}

/**
 * Swings a handle to and fro about where it lay, a move every sixtieth of a second. The pointer is moved
 * by the browser itself: Playwright's own mouse runs a script in the page at every move.
 */
async function drag(page: Page, devtools: CDPSession, name: string): Promise<number> {
  const box = await page.getByRole('slider', { name }).boundingBox();
  if (box === null) throw new Error(`There is no handle “${name}”.`);
  const [left, y] = [box.x + box.width / 2, box.y + box.height / 2];
  const held = { button: 'left', buttons: 1, clickCount: 1 } as const;
  const pointer = (type: 'mousePressed' | 'mouseMoved' | 'mouseReleased', x: number) =>
    devtools.send('Input.dispatchMouseEvent', { type, x, y, ...held });
  await pointer('mousePressed', left);
  const until = performance.now() + seconds * 1000;
  let moves = 0;
  while (performance.now() < until) {
    await pointer('mouseMoved', left + 14 * Math.sin(moves / 9));
    moves += 1;
    await new Promise((done) => setTimeout(done, 1000 / 60));
  }
  await pointer('mouseReleased', left);
  return moves;
}

const thread = ({ pid, tid }: TraceEvent): string => `${pid}/${tid}`;

/** Milliseconds the page's main thread worked for each frame it handed on, and the pictures drawn beside it. */
function readFrames(events: readonly TraceEvent[]) {
  const commits = events.filter(({ name }) => name === 'Commit');
  const counts = new Map<string, TraceEvent[]>();
  for (const each of commits) counts.set(thread(each), [...(counts.get(thread(each)) ?? []), each]);
  // Other processes hand on a frame now and then; the page does all the time.
  const [page] = [...counts].sort(([, a], [, b]) => b.length - a.length);
  if (page === undefined) throw new Error('The trace holds no frame.');
  const ends = page[1].map(({ ts }) => ts).sort((a, b) => a - b);
  const tasks = events
    .filter((each) => each.name === 'RunTask' && thread(each) === page[0])
    .sort((a, b) => a.ts - b.ts);
  const times = ends.map(() => 0);
  let frame = 0;
  for (const { ts, tdur, dur = 0 } of tasks) {
    // A task belongs to the frame that is handed on next: the one that hands it on began before.
    while (frame < ends.length && (ends[frame] ?? 0) < ts) frame += 1;
    if (frame < ends.length) times[frame] = (times[frame] ?? 0) + (tdur ?? dur) / 1000;
  }
  const pictures = events.filter(
    (each) => each.name === 'FireAnimationFrame' && thread(each) !== page[0],
  );
  return { times: times.slice(1).sort((a, b) => a - b), pictures: pictures.length };
}

/**
 * Frame times while a handle is dragged with the processor slowed down four times, read from a trace of
 * the browser: what the main thread worked for each frame, on the built screens (`dist/client`).
 */
export async function benchDrag() {
  const screens = await preview({ preview: { port: 0, host: '127.0.0.1' }, logLevel: 'silent' });
  const browser = await chromium.launch({
    executablePath: '/usr/bin/chromium',
    args: process.getuid?.() === 0 ? ['--no-sandbox'] : [],
  });
  try {
    const page = await browser.newPage({ viewport: { width: 1280, height: 800 } });
    await layOut(page, screens.resolvedUrls?.local[0] ?? '');
    const devtools = await page.context().newCDPSession(page);
    await devtools.send('Emulation.setCPUThrottlingRate', { rate: slowdown });
    let moves = 0;
    const events = await traced(devtools, async () => {
      moves = await drag(page, devtools, 'Finished knee');
    });
    const { times, pictures } = readFrames(events);
    const at = (share: number): number =>
      Math.round((times[Math.floor((times.length - 1) * share)] ?? 0) * 100) / 100;
    return {
      name: `main thread a frame while a handle is dragged ${seconds} s at ${slowdown}x CPU slowdown`,
      frames: times.length,
      moves,
      pictures,
      median: at(0.5),
      p95: at(0.95),
      unit: 'ms',
      against: 'one frame at 60 Hz, 16.67 ms',
    };
  } finally {
    await browser.close();
    await screens.close();
  }
}
