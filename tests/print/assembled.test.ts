import { describe, expect, it } from 'vitest';
import { pdfBytes } from '#server/features/print/pdf-document.ts';
import { balanced } from '#shared/drafting/house-rule-presets.ts';
import { draftGown } from '#shared/engine/draft-gown.ts';
import type { Mark, PrintJob } from '#shared/exports/drawing.ts';
import { tilesJob } from '#shared/exports/tiles.ts';
import { placedChain } from '#shared/sheets/layout.ts';
import { plainOrder } from '#shared/sheets/print-order.ts';
import { planSheets } from '#shared/sheets/sheet-plan.ts';
import type { Tile, TilePlan } from '#shared/sheets/tile-plan.ts';
import { middleBody } from '../support/middle-body.ts';
import { type Picture, renderPart } from '../support/pgm.ts';

const draft = draftGown({ card: middleBody, style: {}, rules: balanced });
const { plan, layout } = planSheets(draft.pieces, plainOrder);
const job = tilesJob(draft, plainOrder, 'cm');
const sheets = job.pages.slice(1);

/** The whole drawing on one page as large as it is: the same pieces at the same places, nothing else. */
const single: PrintJob = {
  ...job,
  paper: { width: layout.width + 20, height: layout.height + 20 },
  pages: [
    layout.placements.map(({ shape, motion }): Mark => ({
      kind: 'use',
      drawing: shape.piece,
      motion,
    })),
  ],
};

const pieceNames = new Set(draft.pieces.map((each) => each.name));

/** A sheet with its pieces alone: no marks, no names. */
const bare = (marks: readonly Mark[]): readonly Mark[] =>
  marks.flatMap((mark): readonly Mark[] => {
    if (mark.kind === 'window') return [{ ...mark, marks: bare(mark.marks) }];
    return mark.kind === 'use' && pieceNames.has(mark.drawing) ? [mark] : [];
  });

/** Where sheets come to lie when they are glued as they say, from the first of each group; mm. */
function laidByGlue({ tiles, use, overlap }: TilePlan): ReadonlyMap<string, Tile['at']> {
  const byName = new Map(tiles.map((each) => [each.name, each]));
  const places = new Map<string, Tile['at']>();
  const step = { x: use.width - overlap, y: use.height - overlap };
  const ways = { right: [1, 0], left: [-1, 0], below: [0, 1], above: [0, -1] } as const;
  for (const first of tiles) {
    if (places.has(first.name)) continue;
    places.set(first.name, first.at);
    const queue = [first];
    for (let tile = queue.pop(); tile; tile = queue.pop()) {
      const at = places.get(tile.name) ?? first.at;
      for (const side of tile.glued) {
        const name = tile.neighbours[side] ?? '';
        const next = byName.get(name);
        if (!next || places.has(name)) continue;
        const [right, down] = ways[side];
        places.set(name, { x: at.x + right * step.x, y: at.y + down * step.y });
        queue.push(next);
      }
    }
  }
  return places;
}

/** Two tenths of a millimetre, in pixels of a tenth. */
const off = 2;

/** Dark pixels of one picture that have none of the other's within two tenths of a millimetre. */
function missing(
  of: Picture,
  inside: Picture,
  within: { readonly width: number; readonly height: number },
): number {
  let lost = 0;
  for (let y = off; y < within.height * 10 - off; y += 1) {
    for (let x = off; x < within.width * 10 - off; x += 1) {
      if (of.grey(x, y) > 100) continue;
      let near = false;
      for (let dy = -off; dy <= off && !near; dy += 1) {
        for (let dx = -off; dx <= off && !near; dx += 1) {
          near = inside.grey(x + dx, y + dy) < 200;
        }
      }
      if (!near) lost += 1;
    }
  }
  return lost;
}

describe('the sheets of the demo gown, laid on each other as they say', () => {
  const places = laidByGlue(plan);

  it('come to lie where the plan has them', () => {
    for (const { name, at } of plan.tiles) {
      expect(places.get(name)?.x).toBeCloseTo(at.x, 9);
      expect(places.get(name)?.y).toBeCloseTo(at.y, 9);
    }
  });

  it('differ from the drawing on one sheet by at most 0.2 mm anywhere', async () => {
    const large = await pdfBytes(single);
    const printed = await pdfBytes({ ...job, pages: sheets });
    const pieces = await pdfBytes({ ...job, pages: sheets.map(bare) });
    const window = { x: plan.margin, y: plan.margin, ...plan.use };
    for (const [i, tile] of plan.tiles.entries()) {
      const at = places.get(tile.name) ?? tile.at;
      const wanted = await renderPart(large, 1, { ...at, ...plan.use });
      const whole = await renderPart(printed, i + 1, window);
      const alone = await renderPart(pieces, i + 1, window);
      // Pieces of other sheets reach into a window's rim, and are not drawn where nothing is glued.
      const own = tile.shows.length === layout.placements.length ? wanted : await onlyOwn(tile, at);
      expect({ sheet: tile.name, lost: missing(own, whole, plan.use) }).toEqual({
        sheet: tile.name,
        lost: 0,
      });
      expect({ sheet: tile.name, added: missing(alone, wanted, plan.use) }).toEqual({
        sheet: tile.name,
        added: 0,
      });
    }
  }, 600_000);

  /** The one large sheet with the pieces alone that this sheet is printed for. */
  async function onlyOwn(tile: Tile, at: Tile['at']): Promise<Picture> {
    const [marks = []] = single.pages;
    const own = marks.filter((_, which) => tile.shows.includes(which));
    const large = await pdfBytes({ ...single, pages: [own] });
    return renderPart(large, 1, { ...at, ...plan.use });
  }

  it('show every piece wholly on the sheets that are printed for it', () => {
    const missed: string[] = [];
    layout.placements.forEach((placement, which) => {
      const own = plan.tiles.filter(({ shows }) => shows.includes(which));
      for (const { x, y } of placedChain(placement)) {
        const shown = own.some(
          ({ at }) =>
            x > at.x && x < at.x + plan.use.width && y > at.y && y < at.y + plan.use.height,
        );
        if (!shown) missed.push(`${placement.shape.piece} at ${x.toFixed(1)}, ${y.toFixed(1)}`);
      }
    });
    expect(missed).toEqual([]);
  });
});
