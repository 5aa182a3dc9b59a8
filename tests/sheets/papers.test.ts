import { describe, expect, it } from 'vitest';
import { boxOf, placedChain } from '#shared/sheets/layout.ts';
import { PlanCancelledError } from '#shared/sheets/plan-cancelled.ts';
import { type PrintOrder, plainOrder, sheetNames } from '#shared/sheets/print-order.ts';
import { type SheetPlan, planInSteps, planSheets } from '#shared/sheets/sheet-plan.ts';
import { printedTiles } from '#shared/sheets/tile-plan.ts';
import { line } from '#shared/geometry/path.ts';
import { point } from '#shared/geometry/point.ts';
import { oblong } from '../support/paper-pieces.ts';

const gown = [
  oblong('front-top', 110, 208),
  oblong('back-top', 140, 200),
  oblong('front-middle', 275, 590, { part: 'middle' }),
  oblong('flare-front', 600, 695, { part: 'flare' }),
];

/** A plan after a few moves: what holds for every plan holds for it. */
function planned(change: Partial<PrintOrder>, pieces = gown): SheetPlan {
  const search = planInSteps(pieces, { ...plainOrder, ...change }, 40);
  let step = search.next();
  while (!step.done) step = search.next();
  return step.value;
}

/** A frame with a hollow of so many millimetres that opens to its side, as a flare's sector does. */
const hollow = (name: string, outer: number, wall: number) => {
  const inner = outer - wall;
  const corners = [
    [0, 0],
    [outer, 0],
    [outer, wall],
    [wall, wall],
    [wall, inner],
    [outer, inner],
    [outer, outer],
    [0, outer],
  ].map(([x = 0, y = 0]) => point(x, y));
  const path = corners.map((from, i) => line(from, corners[(i + 1) % corners.length] ?? from));
  return oblong(name, outer, outer, {
    edges: path.map((each, i) => ({ name: `edge-${i}`, path: [each], kind: 'seam' })),
    cutLine: path,
  });
};

describe.each(sheetNames)('on %s', (paper) => {
  it.each(['portrait', 'landscape', 'fewest'] as const)(
    '%s, all pieces lie on printed sheets',
    (orientation) => {
      const { layout, plan } = planned({ paper, orientation });
      expect(layout.placements.length).toBeGreaterThanOrEqual(gown.length);
      for (const placement of layout.placements) {
        const box = boxOf(placedChain(placement));
        const covered = plan.tiles.some(
          ({ at }) =>
            box.x >= at.x - 1 &&
            box.x <= at.x + plan.use.width &&
            box.y >= at.y - 1 &&
            box.y <= at.y + plan.use.height,
        );
        expect(covered).toBe(true);
      }
    },
  );

  it('fewest takes no more sheets than portrait or landscape', () => {
    const sheets = (['portrait', 'landscape', 'fewest'] as const).map(
      (orientation) => planned({ paper, orientation }).sheets,
    );
    expect(sheets[2]).toBe(Math.min(...sheets));
  });
});

describe('a roll', () => {
  it('is one strip, hardly longer than its pieces need', () => {
    const { plan, sheets, cover } = planned({ paper: 'roll-90cm' });
    expect([sheets, plan.glueSeams, cover]).toEqual([1, 0, 'among the pieces']);
    expect(plan.paper.width).toBe(900);
    // The flare with a top beside it, the skirt below with the cover and the other top: 695 + 6 + 300.
    expect(plan.paper.height).toBeLessThan(1330);
    expect(plan.paper.height).toBeGreaterThan(890);
  });

  it('is glued of two strips where a piece is wider than it both ways', () => {
    const { plan } = planned({ paper: 'roll-36in' }, [oblong('train', 1400, 1200)]);
    expect(plan.tiles.map((each) => each.name)).toEqual(['A1', 'A2']);
    expect(plan.glueSeams).toBe(1);
  });
});

describe('large sheets', () => {
  it('carry the cover among the pieces, upright', () => {
    const { layout, cover, sheets } = planned({ paper: 'A0' });
    expect(cover).toBe('among the pieces');
    expect(sheets).toBe(1);
    expect(layout.placements.find(({ shape }) => shape.piece === 'cover')?.motion.cos).toBe(1);
  });

  it('are not glued where every piece fits one of them', () => {
    expect(planned({ paper: 'A0' }).plan.glueSeams).toBe(0);
  });
});

describe('custom paper', () => {
  it('is taken as typed, and turned where fewer sheets are needed', () => {
    const pieces = [oblong('band', 380, 190)];
    const { plan, sheets } = planned(
      { paper: { width: 220, height: 420 }, orientation: 'fewest' },
      pieces,
    );
    expect(sheets).toBe(2);
    expect(plan.paper).toEqual({ name: 'custom paper', width: 220, height: 420 });
    const lying = planned({ paper: { width: 220, height: 420 }, orientation: 'landscape' }, pieces);
    expect([lying.plan.paper.width, lying.plan.paper.height]).toEqual([420, 220]);
  });
});

describe('the hollow of a piece', () => {
  it('takes another piece that fits in', () => {
    const pieces = [hollow('sector', 800, 60), oblong('front-top', 620, 620)];
    const { plan } = planned({ paper: 'A4' }, pieces);
    const alone = planned({ paper: 'A4' }, pieces.slice(0, 1));
    const other = planned({ paper: 'A4' }, pieces.slice(1));
    expect(plan.tiles.length).toBeLessThan(alone.plan.tiles.length + other.plan.tiles.length);
  });
});

describe('sheets left out', () => {
  const whole = planned({});
  const [first] = whole.plan.tiles;
  const name = first?.name ?? '';
  const part = planned({ leftOut: [name, 'ZZ9'] });

  it('are not counted, and nobody’s neighbours', () => {
    expect(part.sheets).toBe(whole.sheets - 1);
    expect(printedTiles(part.plan).map((each) => each.name)).not.toContain(name);
    const named = part.plan.tiles.flatMap((each) => Object.values(each.neighbours));
    expect(named).not.toContain(name);
  });

  it('stay in the plan, to be taken in again', () => {
    expect(part.plan.tiles.find((each) => each.name === name)?.leftOut).toBe(true);
  });

  it('change nothing about where the pieces lie', () => {
    expect(part.layout).toEqual(whole.layout);
  });
});

describe('what is drawn', () => {
  const fold = oblong('front', 200, 300);
  const order = (how: 'drawn once' | 'mirrored pair' | 'on fold' | 'opened out', copies = 1) =>
    planned({ paper: 'A3', pieces: [{ piece: 'front', copies, how }] }, [fold]).layout.placements;

  it('is as many copies as ordered, and a mirrored pair twice as many', () => {
    expect(order('on fold').length).toBe(1);
    expect(order('drawn once', 3).length).toBe(3);
    expect(order('mirrored pair', 2).length).toBe(4);
  });

  it('is twice as wide where a fold is opened out', () => {
    const [placement] = order('opened out');
    const { width, height } = boxOf(placement?.shape.chain ?? []);
    expect([width, height]).toEqual([400, 300]);
  });

  it('is the finished line alone where only that is asked for', () => {
    const wide = oblong('front', 200, 300, {
      cutLine: oblong('larger', 260, 360).cutLine,
    });
    const chain = (lines: PrintOrder['lines']) =>
      boxOf(planned({ lines }, [wide]).layout.placements[0]?.shape.chain ?? []).width;
    expect([chain('both'), chain('cutting'), chain('finished')]).toEqual([260, 260, 200]);
  });

  it('is a quarter as large at quarter scale', () => {
    const [placement] = planned({ scale: 0.25 }, [fold]).layout.placements;
    expect(boxOf(placement?.shape.chain ?? []).width).toBe(50);
  });
});

describe('a plan on its way', () => {
  it('tells how far it is after every move', () => {
    const told: number[] = [];
    planSheets(gown, plainOrder, { onProgress: ({ moves, of }) => told.push(moves / of) });
    expect(told.length).toBeGreaterThan(100);
    expect(told.at(-1)).toBe(1);
    expect([...told].sort((a, b) => a - b)).toEqual(told);
  });

  it('ends where it is called off, at the next move', () => {
    let asked = 0;
    const calledOff = () => {
      asked += 1;
      return asked > 3;
    };
    expect(() => planSheets(gown, plainOrder, { isCancelled: calledOff })).toThrow(
      PlanCancelledError,
    );
    expect(asked).toBe(4);
  });

  it('can be taken move by move, and comes to the same', () => {
    const steps = planInSteps(gown, plainOrder);
    let step = steps.next();
    while (!step.done) step = steps.next();
    expect(step.value).toEqual(planSheets(gown, plainOrder));
  });

  it('needs no fewer sheets when it is made quickly', () => {
    const quick = planSheets(gown, plainOrder, { effort: 'quick' });
    expect(quick.sheets).toBeGreaterThanOrEqual(planSheets(gown, plainOrder).sheets);
  });
});
