import { describe, expect, test } from 'vitest';
import { balanced } from '#shared/drafting/house-rule-presets.ts';
import type { FinishedPiece } from '#shared/drafting/piece.ts';
import type { StyleCard } from '#shared/drafts/gown/style-card.ts';
import { draftGown } from '#shared/engine/draft-gown.ts';
import type { Draft } from '#shared/engine/draft.ts';
import { pathLength } from '#shared/geometry/curve.ts';
import { speak } from '#shared/units/speak.ts';
import { middleBody } from '../../support/middle-body.ts';

const drafted = (style: StyleCard): Draft =>
  draftGown({ card: middleBody, style, rules: balanced });
const plain = drafted({});

const named = ({ pieces }: Draft, name: string): FinishedPiece => {
  const found = pieces.find((piece) => piece.name === name);
  if (!found) throw new Error(`no piece ${name}`);
  return found;
};
const lengthOf = (piece: FinishedPiece, edge: string): number =>
  pathLength(piece.edges.find(({ name }) => name === edge)?.path ?? []);

const stepOf = ({ steps }: Draft, title: string) => steps.find((step) => step.title === title);

describe('a facing', () => {
  const draft = drafted({ facing: 'faced' });

  test('is one piece a half, its seams closed, 4 mm shorter than the edge over each cup', () => {
    expect(draft.proof.holds).toBe(true);
    const front = named(draft, 'facing-front');
    const edge =
      lengthOf(named(draft, 'front-top-centre'), 'top') +
      lengthOf(named(draft, 'front-top-side'), 'top');
    expect(edge - lengthOf(front, 'top-a') - lengthOf(front, 'top-b')).toBeCloseTo(4, 4);
    const back = named(draft, 'facing-back');
    expect(lengthOf(back, 'top-a') + lengthOf(back, 'top-b')).toBeCloseTo(
      lengthOf(named(draft, 'back-top-centre'), 'top') +
        lengthOf(named(draft, 'back-top-side'), 'top'),
      4,
    );
  });

  test('is 6 cm deep at the centre and along the side', () => {
    const front = named(draft, 'facing-front');
    expect(lengthOf(front, 'centre')).toBeCloseTo(60, 4);
    expect(lengthOf(front, 'side')).toBeCloseTo(60, 4);
  });

  test('follows a top line with a dart in it too, and an armhole edge', () => {
    for (const style of [{ shaping: 'darts' }, { sleeve: 'plainBand' }] as const)
      expect(drafted({ ...style, facing: 'faced' }).proof.holds).toBe(true);
  });
});

describe('a lining', () => {
  const draft = drafted({ lining: 'lined' });

  test('has every piece of the gown once more in lining cloth, and says so on its label', () => {
    expect(draft.proof.holds).toBe(true);
    const lining = draft.pieces.filter(({ cloth }) => cloth === 'lining');
    expect(lining.map(({ name }) => name)).toEqual(
      plain.pieces.map(({ name }) => `lining-${name}`),
    );
    for (const { lettering } of lining)
      expect(lettering.map(({ text }) => text).join(' ')).toMatch(/lining/i);
  });

  test('hangs 25 mm above the gown’s hem, and its seams meet the gown’s own lengths above', () => {
    const [own, inner] = [named(draft, 'flare-back'), named(draft, 'lining-flare-back')];
    expect(lengthOf(own, 'side') - lengthOf(inner, 'side')).toBeCloseTo(25, 3);
    expect(lengthOf(inner, 'hem')).toBeLessThan(lengthOf(own, 'hem'));
    expect(lengthOf(named(draft, 'lining-front-middle'), 'side')).toBe(
      lengthOf(named(draft, 'front-middle'), 'side'),
    );
  });

  test('is in no girth', () => {
    expect(draft.proof.girths).toEqual(plain.proof.girths);
  });

  test('that does not meet its partner fails the proof', () => {
    const worse = draft.pieces.find(({ name }) => name === 'lining-front-middle');
    const seams = draft.proof.seams.filter(({ first }) => first.piece.startsWith('lining-'));
    expect(worse).toBeDefined();
    expect(seams.length).toBeGreaterThanOrEqual(plain.proof.seams.length - 3);
  });
});

describe('bones and waist stay', () => {
  const draft = drafted({ boning: 'boned' });
  const bonesOn = (name: string) =>
    (named(draft, name).lines ?? []).filter(({ kind }) => kind === 'boning');

  test('lie along princess, side and centre back, and end 8 mm short of the seam lines', () => {
    expect(bonesOn('front-top-centre').map(({ name }) => name)).toContain('bone-princess');
    expect(bonesOn('front-top-side').map(({ name }) => name)).toContain('bone-side');
    expect(bonesOn('back-top-centre').map(({ name }) => name)).toContain('bone-centre');
    for (const [piece, edge] of [
      ['front-top-centre', 'princess'],
      ['front-top-side', 'side'],
      ['back-top-centre', 'centre'],
    ] as const) {
      const bone = bonesOn(piece).find(({ name }) => name === `bone-${edge}`);
      const seam = lengthOf(named(draft, piece), edge);
      expect(seam - pathLength(bone?.path ?? [])).toBeCloseTo(16, 3);
    }
  });

  test('are listed with their lengths, and every end is to be capped', () => {
    const step = stepOf(draft, 'Boning');
    expect(speak(step?.said ?? [], 'cm')).toMatch(/front princess seam 2 of [\d.]+ cm/);
    expect(speak(step?.why ?? [], 'cm')).toContain('Cap or bind every end');
  });

  test('come with a ribbon 15 mm shorter than the waist and the line it lies on', () => {
    const stay = named(draft, 'waist-stay');
    expect(stay.cloth).toBe('ribbon');
    expect(2 * (lengthOf(stay, 'upper') - 30)).toBeCloseTo(730 - 15, 6);
    const lines = draft.pieces.flatMap(({ lines: own = [] }) =>
      own.filter(({ kind }) => kind === 'stay'),
    );
    expect(lines).toHaveLength(2);
  });
});
