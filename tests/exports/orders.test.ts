import { describe, expect, it } from 'vitest';
import { balanced } from '#shared/drafting/house-rule-presets.ts';
import { draftGown } from '#shared/engine/draft-gown.ts';
import { labelFacts } from '#shared/engine/label-facts.ts';
import type { Mark, Words } from '#shared/exports/drawing.ts';
import { pens } from '#shared/exports/marks.ts';
import { placedLabels } from '#shared/exports/placed-labels.ts';
import { tilesJob } from '#shared/exports/tiles.ts';
import { typeWidth } from '#shared/exports/type-width.ts';
import { drawnPieces } from '#shared/sheets/drawn-pieces.ts';
import { type PrintOrder, plainOrder } from '#shared/sheets/print-order.ts';
import { planSheets } from '#shared/sheets/sheet-plan.ts';
import { middleBody } from '../support/middle-body.ts';

const draft = draftGown({ card: middleBody, style: {}, rules: balanced });

const lettered = (marks: readonly Mark[]): readonly Words[] =>
  marks.flatMap((mark) =>
    mark.kind === 'words' ? [mark] : mark.kind === 'window' ? lettered(mark.marks) : [],
  );
const said = (marks: readonly Mark[]): readonly string[] => lettered(marks).map(({ text }) => text);

const printed = (change: Partial<PrintOrder>) =>
  tilesJob(draft, { ...plainOrder, ...change }, 'cm');

/** The toile is few sheets: enough for what holds of every piece. */
const toile = { pieces: 'bodice-toile' } as const;

const labelsOf = (
  order: PrintOrder,
): { readonly labels: readonly Words[]; readonly step: { x: number; y: number } } => {
  const sheets = planSheets(draft.pieces, order);
  const drawn = new Map(drawnPieces(draft.pieces, order).map((each) => [each.drawing, each]));
  const facts = labelFacts('gown', middleBody, draft.number, balanced);
  return { labels: placedLabels(sheets, drawn, facts), step: { ...sheets.plan.step } };
};

describe('labels on sheets', () => {
  const { labels, step } = labelsOf(plainOrder);

  it('lie across no seam between sheets', () => {
    const across = labels.filter(({ text, at, size, heavy }) => {
      const width = typeWidth(text, size) * (heavy ? 1.06 : 1);
      const parted = (from: number, to: number, each: number): boolean =>
        Math.floor(to / each) > Math.floor(from / each);
      return parted(at.x, at.x + width, step.x) || parted(at.y - size * 0.7, at.y, step.y);
    });
    expect(labels.length).toBeGreaterThan(draft.pieces.length * 4);
    expect(across.map(({ text }) => text)).toEqual([]);
  });

  it('are upright whichever way a piece is turned, and name every piece', () => {
    expect(labels.every(({ turn }) => turn === undefined)).toBe(true);
    const all = labels.map(({ text }) => text).join(' ');
    for (const { title } of draft.pieces) expect(all).toContain(title);
  });
});

describe('a mirrored pair', () => {
  const pieces = [{ piece: 'front-top-side', copies: 1, how: 'mirrored pair' }] as const;
  const job = printed({ pieces });

  it('is two drawings, one the mirror image of the other', () => {
    const names = job.drawings.map(({ name }) => name);
    expect(names).toEqual(expect.arrayContaining(['front-top-side', 'front-top-side mirrored']));
    const [one, other] = ['front-top-side', 'front-top-side mirrored'].map((name) => {
      const marks = job.drawings.find((each) => each.name === name)?.marks ?? [];
      const cut = marks.find((mark) => mark.kind === 'strokes' && mark.pen === pens.cut);
      if (cut?.kind !== 'strokes') throw new Error('No cutting line.');
      return cut.paths.flat().flatMap(({ from }) => [from]);
    });
    const mirrored = (one ?? []).map(({ x, y }) => ({ x: -x, y }));
    for (const { x, y } of other ?? []) {
      expect(mirrored.some((each) => Math.hypot(each.x - x, each.y - y) < 1e-6)).toBe(true);
    }
  });

  it('says on each half what to cut, in letters that are not mirrored', () => {
    const all = job.pages.slice(1).flatMap(said).join(' ');
    expect(all).toContain('mirrored');
    expect(all.split('cut 1 of this').length).toBeGreaterThanOrEqual(3);
  });
});

describe('a fold opened out', () => {
  const job = printed({ pieces: [{ piece: 'front-middle', copies: 1, how: 'opened out' }] });

  it('has no fold to place on, and its centre line', () => {
    const marks = said(job.drawings.find(({ name }) => name === 'front-middle')?.marks ?? []);
    expect(marks).toContain('centre');
    expect(marks).not.toContain('place on fold');
  });

  it('is labelled as the whole piece', () => {
    expect(job.pages.slice(1).flatMap(said)).toContain('cut 1, opened out');
  });
});

describe.each([
  [0.5, 'half scale, do not cut'],
  [0.25, 'quarter scale, do not cut'],
] as const)('sheets at scale %f', (scale, words) => {
  const job = printed({ scale });

  it('say on every sheet, and on the cover, that nobody is to cut', () => {
    for (const page of job.pages.slice(1)) expect(said(page)).toContain(words);
    expect(
      said(job.pages[0] ?? [])
        .join(' ')
        .toLowerCase(),
    ).toContain(words);
  });

  it('have no whole line to cut on, and no label that says to', () => {
    const strokes = job.drawings.flatMap(({ name, marks }) =>
      draft.pieces.some((each) => each.name === name) ? marks : [],
    );
    expect(strokes.some((mark) => mark.kind === 'strokes' && mark.closed && !mark.pen.dash)).toBe(
      false,
    );
    expect(job.pages.flatMap(said).join(' ')).not.toContain('cut on the solid line');
  });

  it('name every piece, or number it as the cover does', () => {
    const all = job.pages.slice(1).flatMap(said).join(' ');
    draft.pieces.forEach(({ title }, i) => {
      expect(all.includes(title) || all.includes(`no. ${i + 1}`)).toBe(true);
      expect(said(job.pages[0] ?? [])).toContain(`${i + 1}  ${title}`);
    });
  });

  it('have no letter under 2.2 mm', () => {
    const marks = [...job.pages, ...job.drawings.map((each) => each.marks)].flatMap(lettered);
    expect(Math.min(...marks.map(({ size }) => size))).toBeGreaterThanOrEqual(2.1);
  });
});

describe('lines that were chosen', () => {
  const kinds = (change: Partial<PrintOrder>) =>
    new Set(
      printed({ ...toile, ...change }).drawings.flatMap(({ marks }) =>
        marks.flatMap((mark) => (mark.kind === 'strokes' ? [mark.pen] : [])),
      ),
    );

  it('are both, the cutting line alone, or the finished line alone with notches inside it', () => {
    expect(kinds({})).toContain(pens.seam);
    expect(kinds({ lines: 'cutting' })).not.toContain(pens.seam);
    const finished = printed({ ...toile, lines: 'finished' });
    expect(finished.pages.flatMap(said)).toContain('finished line only · add the allowances');
    expect(kinds({ lines: 'finished' })).not.toContain(pens.seam);
  });

  it('are thinner where ink is saved, and nothing is filled', () => {
    const saving = printed({ ...toile, inkSaving: true });
    const marks = [...saving.pages, ...saving.drawings.map((each) => each.marks)].flat();
    const names = new Set(draft.pieces.map(({ name }) => name));
    const pieces = saving.drawings
      .filter(({ name }) => names.has(name))
      .flatMap((each) => each.marks);
    expect(pieces.some((mark) => mark.kind === 'area')).toBe(false);
    const widths = pieces.flatMap((mark) =>
      mark.kind === 'strokes' && mark.pen.grey === undefined ? [mark.pen.width] : [],
    );
    expect(Math.max(...widths)).toBeLessThan(pens.cut.width);
    expect(lettered(marks).some(({ size }) => size > 15)).toBe(false);
  });
});

describe('glue marks', () => {
  it('are left away where nobody wants them; the lines to trim by stay', () => {
    const bare = printed({ glueMarks: false });
    const strip = bare.drawings.find(({ name }) => name === 'glue-right');
    expect(strip?.marks.length).toBe(1);
    expect(bare.drawings.find(({ name }) => name === 'trim-left')?.marks).toEqual([]);
  });
});
