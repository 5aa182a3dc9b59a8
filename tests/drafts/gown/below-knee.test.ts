import { describe, expect, it } from 'vitest';
import type { MeasureCard } from '#shared/body/card.ts';
import { sampleCards } from '#shared/body/sample-cards.ts';
import { edgeAllowance } from '#shared/drafting/edge-allowance.ts';
import { DraftingError } from '#shared/drafting/drafting-error.ts';
import { balanced } from '#shared/drafting/house-rule-presets.ts';
import type { FinishedPiece } from '#shared/drafting/piece.ts';
import { styleChoices, type StyleCard } from '#shared/drafts/gown/style-card.ts';
import { draftGown } from '#shared/engine/draft-gown.ts';
import type { Draft } from '#shared/engine/draft.ts';
import { finishPiece } from '#shared/finishing/finish-piece.ts';
import { endOf, flatten, pathLength, startOf } from '#shared/geometry/curve.ts';
import { point } from '#shared/geometry/point.ts';
import { prove } from '#shared/proof/prove.ts';
import type { Problem } from '#shared/units/problem.ts';
import { speak } from '#shared/units/speak.ts';
import { moveSeamPoint, withPiece } from '../../support/tamper.ts';

const drawn = (style: StyleCard, card: MeasureCard = sampleCards.judith): Draft =>
  draftGown({ card, style, rules: balanced });

const pieceNamed = ({ pieces }: Draft, name: string): FinishedPiece => {
  const found = pieces.find((piece) => piece.name === name);
  if (!found) throw new Error(`no piece ${name}`);
  return found;
};

const edgeOf = (piece: FinishedPiece, name: string) => {
  const found = piece.edges.find((edge) => edge.name === name);
  if (!found) throw new Error(`${piece.name} has no ${name}`);
  return found;
};

/** Length all round of what is turned up at the hem. */
const hemOf = ({ pieces }: Draft): number =>
  2 *
  pieces
    .flatMap((piece) => piece.edges.filter(({ kind }) => kind === 'hem'))
    .reduce((sum, { path }) => sum + pathLength(path), 0);

const refusal = (style: StyleCard): readonly Problem[] => {
  try {
    drawn(style);
  } catch (error) {
    if (error instanceof DraftingError) return error.problems;
    throw error;
  }
  return [];
};

const kinds = styleChoices.flare.flatMap((flare) =>
  styleChoices.waistSeam.map((waistSeam) => ({ flare, waistSeam })),
);

describe.each(kinds)('a gown with $flare below the knee and a waist seam: $waistSeam', (style) => {
  it.each(Object.values(sampleCards))(
    'sews together for $name, with a train and without',
    (card) => {
      for (const train of [0, 60]) {
        const draft = drawn({ ...style, train }, card);
        expect(speak(draft.proof.verdict, 'cm')).toBe('These pieces sew together.');
        const knee = draft.proof.girths.find(({ level }) => level === 'knee-seam');
        expect(Math.abs((knee?.pieces ?? 0) - draft.style.kneeFinished)).toBeLessThan(0.5);
      }
    },
  );

  it('has the hem that was asked for, and says how full it is', () => {
    const draft = drawn({ ...style, hemSweep: 1700, flareFraction: 0.4 });
    const { kneeFinished, flareLength } = draft.style;
    const asked = style.flare === 'circle' ? kneeFinished + 2 * Math.PI * 0.4 * flareLength : 1700;
    expect(Math.abs(hemOf(draft) - asked)).toBeLessThan(0.01);
    const told = draft.steps.map(({ said }) => speak(said, 'cm')).join('\n');
    expect(told).toContain(`${(asked / 10).toFixed(1)} cm`);
  });

  it('hangs level all round, but for the train in the back alone', () => {
    const [level, trained] = [drawn(style), drawn({ ...style, train: 60 })];
    const onlyFront = ({ pieces }: Draft): unknown =>
      pieces
        .filter((piece) => piece.side === 'front' && piece.part !== 'flare')
        .map(({ edges }) => edges);
    expect(onlyFront(trained)).toEqual(onlyFront(level));
    expect(hemOf(trained)).toBeGreaterThan(hemOf(level));
    expect(
      trained.steps.some(
        ({ title, why }) => title === 'Train' && /stairs/.test(speak(why ?? [], 'cm')),
      ),
    ).toBe(true);
  });
});

describe('godets', () => {
  const draft = drawn({ flare: 'godets' });
  const slit = edgeOf(pieceNamed(draft, 'front-middle'), 'godet-side');

  it('are as long at their sides as the slits they are set into, knee line to hem', () => {
    const godet = pieceNamed(draft, 'godet-side');
    for (const name of ['near', 'far']) {
      expect(pathLength(edgeOf(godet, name).path)).toBeCloseTo(draft.style.flareLength, 9);
    }
    expect(pathLength(slit.path)).toBeCloseTo(draft.style.flareLength, 9);
  });

  it('are turned up as narrowly as the straight hem beside them, so that both meet at the seam', () => {
    const hems = draft.pieces.flatMap((piece) => piece.edges.filter(({ kind }) => kind === 'hem'));
    const depths = hems.map((edge) => edgeAllowance(edge, balanced));
    expect(new Set(depths)).toEqual(new Set([balanced.allowance.hem]));
  });

  it('are told how their point is reinforced', () => {
    const step = draft.steps.find(({ title }) => title === 'Setting in the godets');
    expect(speak(step?.said ?? [], 'cm')).toMatch(/stay over the point/);
  });

  it('wider than the cloth are cut in two halves', () => {
    const narrow = drawn({ flare: 'godets', clothWidth: 700, hemSweep: 3000 });
    expect(narrow.pieces.map(({ name }) => name)).toEqual(
      expect.arrayContaining(['godet-side-a', 'godet-side-b']),
    );
    for (const { cutLine } of narrow.pieces.filter(({ part }) => part === 'flare')) {
      const across = flatten(cutLine, 0.1).map(({ x }) => x);
      expect(Math.max(...across) - Math.min(...across)).toBeLessThanOrEqual(700);
    }
  });

  it('whose point slips by a millimetre are found by the proof', () => {
    const label = { draftNumber: 'TEST', cloth: 'cloth' };
    const pieces = withPiece(draft.pieces, 'godet-side', (piece) =>
      finishPiece(moveSeamPoint(piece, point(0, 0), point(0, 1)), balanced, label),
    );
    const proof = prove({ pieces, construction: draft.construction, rules: balanced });
    expect(proof.lines.filter(({ holds }) => !holds).map(({ number }) => number)).toEqual([2]);
  });

  it('set into a slit that is no longer straight with its seam are found by the proof', () => {
    const label = { draftNumber: 'TEST', cloth: 'cloth' };
    const foot = endOf(slit.path);
    if (!foot) throw new Error('the slit has no end');
    const pieces = withPiece(draft.pieces, 'front-middle', (piece) =>
      finishPiece(moveSeamPoint(piece, foot, point(10, 0)), balanced, label),
    );
    const { lines } = prove({ pieces, construction: draft.construction, rules: balanced });
    expect(lines.find(({ number }) => number === 4)?.holds).toBe(false);
  });
});

describe('seams that run on outwards', () => {
  const draft = drawn({ flare: 'integral', hemSweep: 1600 });
  const { flareLength } = draft.style;

  it('are all as long below the knee line as the skirt is deep there', () => {
    for (const name of ['front-middle', 'back-middle']) {
      const piece = pieceNamed(draft, name);
      const knee = piece.levels.find(({ level }) => level === 'knee-seam');
      for (const edge of piece.edges.filter((each) => ['side', 'centre'].includes(each.name))) {
        const below = flatten(edge.path, 0.001).filter(({ y }) => y >= (knee?.from.y ?? 0) - 1e-6);
        const length = below.reduce((sum, at, i) => {
          const before = below[i - 1];
          return before ? sum + Math.hypot(at.x - before.x, at.y - before.y) : sum;
        }, 0);
        expect(Math.abs(length - flareLength)).toBeLessThan(0.05);
      }
    }
  });

  it('end higher than the level middle of the hem, as a slanting seam is longer than its height', () => {
    const piece = pieceNamed(draft, 'front-middle');
    const hem = edgeOf(piece, 'hem').path;
    const [side, centre] = [startOf(hem), endOf(hem)];
    expect(centre?.y).toBeCloseTo(draft.levels.hem, 9);
    expect((centre?.y ?? 0) - (side?.y ?? 0)).toBeGreaterThan(5);
  });

  it('are marked where they leave the upright, and have no piece sewn on at the knee', () => {
    expect(draft.pieces.filter(({ part }) => part === 'flare')).toEqual([]);
    expect(
      pieceNamed(draft, 'back-middle').notches.filter(({ name }) => name === 'knee'),
    ).toHaveLength(2);
  });
});

describe('what cannot be drawn is refused with the other choice and what can', () => {
  it('a hem wider than seams can run out to', () => {
    const [problem] = refusal({ flare: 'integral', hemSweep: 4000 });
    expect(problem).toMatchObject({ code: 'out-of-range', field: 'style.hemSweep' });
    expect(problem?.with).toContain('style.flare');
    expect(speak(problem?.said ?? [], 'cm')).toMatch(
      /Hem sweep 400\.0 cm must lie between .* choose a circle/,
    );
  });

  it('a train longer than a narrow flare can lead into', () => {
    const [problem] = refusal({ flare: 'godets', train: 900 });
    expect(problem).toMatchObject({ code: 'out-of-range', field: 'style.train' });
    expect(problem?.with).toContain('style.flare');
    expect(speak(problem?.said ?? [], 'cm')).toMatch(/Train 90\.0 cm must lie between 0\.0 cm and/);
  });
});

describe('a train on a circle', () => {
  it('leaves the side seams alone and is longest at the centre back', () => {
    const draft = drawn({ train: 500 });
    const back = pieceNamed(draft, 'flare-back');
    const depth = draft.style.flareLength;
    expect(pathLength(edgeOf(back, 'side').path)).toBeCloseTo(depth, 9);
    expect(pathLength(edgeOf(back, 'centre').path)).toBeCloseTo(depth + 500, 9);
  });

  it('in narrow cloth is divided until every gore fits, allowances and all', () => {
    const draft = drawn({ train: 700, flareFraction: 1, clothWidth: 700 });
    const gores = draft.pieces.filter(({ part }) => part === 'flare');
    expect(gores.length).toBeGreaterThan(4);
    for (const { cutLine, copies } of gores) {
      const across = flatten(cutLine, 0.1).map(({ x }) => x);
      const width = Math.max(...across) - Math.min(...across);
      expect(copies === 1 ? 2 * width : width).toBeLessThanOrEqual(700);
    }
    expect(draft.proof.holds).toBe(true);
  });
});
