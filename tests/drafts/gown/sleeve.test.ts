import { describe, expect, it } from 'vitest';
import type { MeasureCard } from '#shared/body/card.ts';
import { sampleCards } from '#shared/body/sample-cards.ts';
import { DraftingError } from '#shared/drafting/drafting-error.ts';
import { balanced } from '#shared/drafting/house-rule-presets.ts';
import type { FinishedPiece } from '#shared/drafting/piece.ts';
import { planBand, shapeBand } from '#shared/drafts/gown/band.ts';
import type { StyleCard } from '#shared/drafts/gown/style-card.ts';
import { draftGown } from '#shared/engine/draft-gown.ts';
import type { Draft } from '#shared/engine/draft.ts';
import { finishPiece } from '#shared/finishing/finish-piece.ts';
import { endOf, pathLength, startOf } from '#shared/geometry/curve.ts';
import { point } from '#shared/geometry/point.ts';
import { prove } from '#shared/proof/prove.ts';
import { speak } from '#shared/units/speak.ts';
import { moveSeamPoint, withPiece } from '../../support/tamper.ts';

const drawn = (style: StyleCard, card: MeasureCard = sampleCards.judith): Draft =>
  draftGown({ card, style, rules: balanced });

const bandOf = ({ pieces }: Draft): FinishedPiece => {
  const found = pieces.find(({ name }) => name === 'sleeve-band');
  if (!found) throw new Error('no band was drawn');
  return found;
};

const lengthOf = (piece: FinishedPiece, name: string): number =>
  piece.edges
    .filter((edge) => edge.name === name)
    .reduce((sum, { path }) => sum + pathLength(path), 0);

/** Length of the edges of a kind on the tops of one side. */
const topsOf = ({ pieces }: Draft, side: 'front' | 'back', kind: string): number =>
  pieces
    .filter((piece) => piece.side === side && piece.part === 'top' && piece.cloth === undefined)
    .flatMap((piece) => piece.edges.filter((edge) => edge.kind === kind))
    .reduce((sum, { path }) => sum + pathLength(path), 0);

const bands = (['plainBand', 'pleatedBand'] as const).flatMap((sleeve) =>
  (['raised', 'none'] as const).flatMap((waistSeam) =>
    (['princess', 'darts'] as const).map((shaping) => ({ sleeve, waistSeam, shaping })),
  ),
);

describe.each(bands)('a gown with a $sleeve, waist seam $waistSeam, $shaping', (style) => {
  it.each(Object.values(sampleCards))('sews together for $name, low bands and high', (card) => {
    for (const bandHeight of [60, 110, 200]) {
      let draft: Draft;
      try {
        draft = drawn({ ...style, bandHeight }, card);
      } catch (error) {
        if (error instanceof DraftingError && style.shaping === 'darts') continue;
        throw error;
      }
      expect(speak(draft.proof.verdict, 'cm')).toBe('These pieces sew together.');
    }
  });
});

describe('the arm path', () => {
  it('is half of shoulder girth and ease less the finished top edges up to the set-in points', () => {
    for (const armEase of [0, 40]) {
      const draft = drawn({ sleeve: 'plainBand', armEase });
      const girth = draft.body.measures.shoulderGirth + armEase;
      const left = girth / 2 - topsOf(draft, 'front', 'top') - topsOf(draft, 'back', 'top');
      expect(lengthOf(bandOf(draft), 'upper')).toBeCloseTo(left, 3);
    }
  });

  it('is never less than two fifths of the arm, and a ring that is longer than the tape is told', () => {
    const card = { ...sampleCards.judith, shoulderGirth: 940 };
    const draft = drawn({ sleeve: 'plainBand' }, card);
    expect(lengthOf(bandOf(draft), 'upper')).toBeCloseTo(
      0.4 * draft.body.measures.upperArmGirth,
      3,
    );
    const warned = draft.warnings.find(({ code }) => code === 'band-loose');
    expect(warned?.with).toContain('card.shoulderGirth');
    expect(speak(warned?.said ?? [], 'in')).toMatch(/longer than the shoulder girth/);
  });
});

describe('a plain band', () => {
  const draft = drawn({ sleeve: 'plainBand' });
  const band = bandOf(draft);

  it('goes round the arm at its lower edge with 20 to 40 of room (common practice)', () => {
    const room = lengthOf(band, 'lower') - draft.body.measures.upperArmGirth;
    expect(room).toBeGreaterThanOrEqual(20);
    expect(room).toBeLessThanOrEqual(40);
  });

  it('is sewn to both armholes and, below them, to itself under the arm', () => {
    for (const side of ['front', 'back'] as const) {
      expect(lengthOf(band, side)).toBeCloseTo(topsOf(draft, side, 'armhole'), 2);
    }
    expect(lengthOf(band, 'front-under')).toBeGreaterThan(8);
    expect(lengthOf(band, 'front-under')).toBeCloseTo(lengthOf(band, 'back-under'), 9);
  });

  it('lower than the armholes leaves the rest of them open and marks where it ends', () => {
    const low = drawn({ sleeve: 'plainBand', bandHeight: 60 });
    const front = low.pieces.find(({ edges }) => edges.some(({ name }) => name === 'armhole-band'));
    expect(front?.edges.map(({ name }) => name)).toEqual(
      expect.arrayContaining(['armhole-band', 'armhole']),
    );
    expect(front?.notches.map(({ name }) => name)).toContain('set-in');
    expect(lengthOf(bandOf(low), 'front')).toBeCloseTo(60, 6);
  });

  it('whose end slips by a millimetre along the armhole is found by the proof', () => {
    const end = endOf(band.edges.find(({ name }) => name === 'front')?.path ?? []);
    const start = startOf(band.edges.find(({ name }) => name === 'front')?.path ?? []);
    if (!end || !start) throw new Error('the band has no front end');
    const size = Math.hypot(end.x - start.x, end.y - start.y);
    const by = point((end.x - start.x) / size, (end.y - start.y) / size);
    const pieces = withPiece(draft.pieces, 'sleeve-band', (piece) =>
      finishPiece(moveSeamPoint(piece, end, by), balanced, { draftNumber: 'TEST', cloth: 'cloth' }),
    );
    const { lines } = prove({ pieces, construction: draft.construction, rules: balanced });
    expect(lines.find(({ number }) => number === 2)?.holds).toBe(false);
  });
});

describe('a pleated band', () => {
  const draft = drawn({ sleeve: 'pleatedBand', pleatRatio: 2, bandHeight: 150 });
  const band = bandOf(draft);

  it('is cut to the arm path times its ratio, and its stay holds it to the arm path', () => {
    const stay = draft.pieces.find(({ name }) => name === 'sleeve-band-stay');
    const upper = band.edges.find(({ name }) => name === 'upper');
    expect(upper?.ratio).toBe(2);
    expect(lengthOf(band, 'upper')).toBeCloseTo(2 * (stay ? lengthOf(stay, 'band') : 0), 9);
  });

  it('draws for each pleat the line it is folded on and the line it is laid on', () => {
    const kinds = (band.lines ?? []).map(({ kind }) => kind);
    const folds = kinds.filter((kind) => kind === 'pleat-fold').length;
    expect(folds).toBeGreaterThanOrEqual(3);
    expect(kinds.filter((kind) => kind === 'pleat-place')).toHaveLength(folds);
  });

  it('is told by its cloth, its depth before folding and its pleats, in the reader’s unit', () => {
    const step = draft.steps.find(({ title }) => title === 'Pleated band');
    expect(speak(step?.said ?? [], 'cm')).toMatch(/30\.0 cm deep before folding; \d+ pleats each/);
    expect(speak(step?.said ?? [], 'in')).toMatch(/11\s13⁄16 in deep before folding/);
  });

  it('whose stay is a millimetre long is found by the proof', () => {
    const pieces = withPiece(draft.pieces, 'sleeve-band-stay', (piece) => {
      const foot = startOf(piece.edges.find(({ name }) => name === 'band')?.path ?? []);
      if (!foot) throw new Error('the stay has no edge');
      return finishPiece(moveSeamPoint(piece, foot, point(1, 0)), balanced, {
        draftNumber: 'TEST',
        cloth: 'cloth',
      });
    });
    const { lines } = prove({ pieces, construction: draft.construction, rules: balanced });
    expect(lines.find(({ number }) => number === 2)?.holds).toBe(false);
  });

  it('too tight for the arm at its fold is told, with what mends it', () => {
    const tight = drawn({ sleeve: 'pleatedBand', pleatRatio: 1.2 });
    const warned = tight.warnings.find(({ code }) => code === 'band-tight');
    expect(warned?.field).toBe('style.pleatRatio');
    expect(drawn({ sleeve: 'pleatedBand' }).warnings.map(({ code }) => code)).not.toContain(
      'band-tight',
    );
  });
});

describe('a plain band that no cloth can be bent to', () => {
  it('is not shaped: a low ring that has to widen from next to nothing to a whole arm', () => {
    const plan = planBand({
      girth: 800,
      arm: 420,
      frontTop: 190,
      backTop: 190,
      frontArmhole: 60,
      backArmhole: 60,
      height: 60,
      pleated: false,
    });
    expect(shapeBand({ ...plan, path: 60 })).toBeUndefined();
  });
});
