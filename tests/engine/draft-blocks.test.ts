import { describe, expect, test } from 'vitest';
import type { MeasureCard } from '#shared/body/card.ts';
import { DraftingError } from '#shared/drafting/drafting-error.ts';
import { sampleCards } from '#shared/body/sample-cards.ts';
import { balanced, quarterRule } from '#shared/drafting/house-rule-presets.ts';
import { type BodiceBlockCard, dartPlaces } from '#shared/drafts/bodice-block/style-card.ts';
import { draftBodiceBlock } from '#shared/engine/draft-bodice-block.ts';
import { draftSkirtBlock } from '#shared/engine/draft-skirt-block.ts';
import { endTangent, pathLength, startTangent } from '#shared/geometry/curve.ts';
import { speak } from '#shared/units/speak.ts';
import { middleBody } from '../support/middle-body.ts';

const bodice = (style: BodiceBlockCard = {}, card: MeasureCard = middleBody) =>
  draftBodiceBlock({ card, style, rules: balanced });
const skirt = (style = {}) => draftSkirtBlock({ card: middleBody, style, rules: balanced });

function refusalOf(draw: () => unknown): DraftingError {
  try {
    draw();
  } catch (error) {
    if (error instanceof DraftingError) return error;
    throw error;
  }
  throw new Error('not refused');
}

const edgeOf = (draft: ReturnType<typeof bodice>, piece: string, name: string) => {
  const found = draft.pieces.find((each) => each.name === piece)?.edges;
  const edge = found?.find((each) => each.name === name);
  if (!edge) throw new Error(`no edge ${piece} ${name}`);
  return edge;
};

describe('a bodice block', () => {
  test('is a front on the fold and a pair of backs, and sews together wherever its dart is', () => {
    for (const bustDart of dartPlaces) {
      const draft = bodice({ bustDart });
      expect(draft.pieces.map(({ name, copies }) => [name, copies])).toEqual([
        ['bodice-front', 1],
        ['bodice-back', 2],
      ]);
      expect(speak(draft.proof.verdict, 'cm')).toBe('These pieces sew together.');
    }
  });

  test('the back shoulder is longer by its ease, and says so on its edge', () => {
    const draft = bodice({ shoulderEase: 8 });
    const length = (piece: string): number =>
      ['shoulder-a', 'shoulder-b'].reduce(
        (sum, name) => sum + pathLength(edgeOf(draft, piece, name).path),
        0,
      );
    expect(length('bodice-back') - length('bodice-front')).toBeCloseTo(8, 9);
    const back = ['shoulder-a', 'shoulder-b'].map(
      (name) => edgeOf(draft, 'bodice-back', name).ease ?? 0,
    );
    expect(back[0]).toBeCloseTo(4, 9);
    expect(back[1]).toBeCloseTo(4, 9);
  });

  test('the opening is added to the width: a wider dart leaves shoulder, side and bust line as they were', () => {
    const [narrow, wide] = (['proportional', 'cup'] as const).map((bustDartRule) =>
      bodice({ bustDartRule }, { ...middleBody, bustGirth: 820, underbustGirth: 620 }),
    );
    if (!narrow || !wide) throw new Error('both are drawn');
    for (const name of ['shoulder-a', 'shoulder-b', 'side']) {
      const [a, b] = [narrow, wide].map((each) => edgeOf(each, 'bodice-front', name).path);
      expect(pathLength(a ?? [])).toBeCloseTo(pathLength(b ?? []), 9);
    }
    const mouth = (draft: typeof wide): number =>
      pathLength(edgeOf(draft, 'bodice-front', 'bust-mouth').path);
    expect(mouth(wide)).toBeGreaterThan(mouth(narrow) + 10);
  });

  test('the armhole turns one way only and is square to shoulder and side', () => {
    const draft = bodice();
    for (const piece of ['bodice-front', 'bodice-back']) {
      const arm = edgeOf(draft, piece, 'armhole').path;
      const shoulder = endTangent(edgeOf(draft, piece, 'shoulder-b').path);
      const side = startTangent(edgeOf(draft, piece, 'side').path);
      const [from, to] = [startTangent(arm), endTangent(arm)];
      expect(Math.abs(from.x * shoulder.x + from.y * shoulder.y)).toBeLessThan(1e-9);
      expect(Math.abs(to.x * side.x + to.y * side.y)).toBeLessThan(1e-9);
      const turns = arm.map((segment) => {
        const [a, b] = [startTangent([segment]), endTangent([segment])];
        return Math.sign(a.x * b.y - a.y * b.x);
      });
      expect(new Set(turns)).toEqual(new Set([-1]));
    }
  });

  test('says in its steps how each line was found, and warns of the estimates it leans on', () => {
    const draft = bodice();
    const said = draft.steps.map((step) => `${step.id}: ${speak(step.said, 'cm')}`);
    expect(said).toContain(
      'front/bust-line: Square out from the centre: a quarter of (bust 92.0 cm + ease 6.0 cm) = 24.5 cm + balance 1.0 cm = 25.5 cm.',
    );
    expect(said.find((each) => each.startsWith('front/bust-dart'))).toContain('18.8°');
    expect(new Set(draft.steps.map(({ id }) => id)).size).toBe(draft.steps.length);
    const [warned] = draft.warnings;
    expect(warned?.code).toBe('block-leans-on-estimates');
    expect(warned && speak(warned.said, 'in')).toContain('shoulder length');
    const moved = bodice({ bustDart: 'side' }).steps.find(({ id }) => id === 'front/dart-moved');
    expect(moved && speak(moved.said, 'in')).toContain('side seam');
  });

  test('the same inputs give the same draft, byte for byte', () => {
    const again = bodice({ bustDart: 'armhole' });
    expect(JSON.stringify(bodice({ bustDart: 'armhole' }))).toBe(JSON.stringify(again));
    expect(again.number).not.toBe(bodice().number);
  });
});

describe('the bust dart, wherever it is sewn', () => {
  const fullBust = {
    ...middleBody,
    bustGirth: 1120,
    underbustGirth: 850,
    waistGirth: 860,
    hipGirth: 1080,
    bustSpan: 225,
    sideNeckToBustPoint: 290,
    sideNeckToUnderbust: 400,
    frontWaistLength: 480,
  };
  const seams = ['neck', 'shoulder', 'armhole', 'side', 'waist'] as const;
  const seamLengths = (draft: ReturnType<typeof bodice>): readonly number[] =>
    seams.map((seam) =>
      (draft.pieces[0]?.edges ?? [])
        .filter(({ name, open }) => open !== true && (name === seam || name.startsWith(`${seam}-`)))
        .reduce((sum, { path }) => sum + pathLength(path), 0),
    );

  test.each(dartPlaces)(
    'in the %s no seam changes its length, and the darts at the bust point keep their angle',
    (bustDart) => {
      for (const card of [middleBody, fullBust]) {
        const [before, after] = [bodice({}, card), bodice({ bustDart }, card)];
        seamLengths(after).forEach((length, k) => {
          expect(length, seams[k]).toBeCloseTo(seamLengths(before)[k] ?? 0, 6);
        });
        expect(angleAtBustPoint(after)).toBeCloseTo(angleAtBustPoint(before), 6);
      }
    },
  );

  function angleAtBustPoint(draft: ReturnType<typeof bodice>): number {
    return (draft.pieces[0]?.darts ?? []).reduce((sum, { centreLeg, sideLeg }) => {
      const [a, b] = [centreLeg, sideLeg].map((leg) => endTangent(leg));
      const tip = centreLeg[0]?.to;
      const atBust =
        tip &&
        Math.hypot(tip.x - (draft.bustPoint?.x ?? 0), tip.y - (draft.bustPoint?.y ?? 0)) < 1e-6;
      return atBust && a && b ? sum + Math.acos(Math.min(1, a.x * b.x + a.y * b.y)) : sum;
    }, 0);
  }

  test('what a round armhole cannot fold is sewn in the waist, and the step says how much', () => {
    const draft = bodice({ bustDart: 'armhole' }, fullBust);
    const step = draft.steps.find(({ id }) => id === 'front/dart-moved');
    expect(step && speak(step.said, 'cm')).toMatch(/The other \d+\.\d° are sewn in the waist/);
    expect(draft.proof.holds).toBe(true);
    const middle = bodice({ bustDart: 'armhole' }).steps.find(
      ({ id }) => id === 'front/dart-moved',
    );
    expect(middle && speak(middle.said, 'cm')).not.toContain('The other');
  });

  test('for the top line it stands straight above the bust point', () => {
    const draft = bodice({ bustDart: 'topLine' });
    const dart = draft.pieces[0]?.darts.find(({ name }) => name === 'bust');
    expect(dart?.centreLeg[0]?.from.x).toBeCloseTo(draft.bustPoint?.x ?? 0, 6);
  });
});

describe('a skirt block', () => {
  test('reaches the knee unless it is told otherwise, and sews together', () => {
    const draft = skirt();
    expect((draft.levels.hem ?? 0) - draft.bodyLevels.waist).toBeCloseTo(585, 6);
    expect(draft.proof.holds).toBe(true);
    expect(skirt({ length: 700 }).style.length).toBe(700);
  });

  test('its waist rises at the side, alike in front and back', () => {
    const draft = skirt();
    const tops = draft.pieces.map(
      (piece) => piece.edges.find(({ name }) => name === 'side')?.path[0]?.from.y ?? 0,
    );
    for (const top of tops) {
      expect(draft.bodyLevels.waist - top).toBeGreaterThan(3);
      expect(draft.bodyLevels.waist - top).toBeLessThanOrEqual(20);
    }
  });
});

describe('the seat of a skirt block', () => {
  const dartsOf = (card: MeasureCard, rules = balanced, style = {}) =>
    draftSkirtBlock({ card, style, rules }).pieces.map((piece) =>
      piece.darts.reduce(
        (sum, { centreLeg, sideLeg }) =>
          sum + (sideLeg[0]?.from.x ?? 0) - (centreLeg[0]?.from.x ?? 0),
        0,
      ),
    );

  test('a hip-heavy body has more to sew in the back’s darts than in the front’s', () => {
    for (const rules of [balanced, quarterRule]) {
      const style = rules === quarterRule ? { seat: 20 } : {};
      const [front = 0, back = 0] = dartsOf(sampleCards.lotte, rules, style);
      expect(back).toBeGreaterThan(front + 15);
    }
  });

  test('PP’s skirt, waist 68 and hip 94: the back hip is 1.5 wider than the front’s (seen)', () => {
    const card = { ...middleBody, waistGirth: 680, hipGirth: 940 };
    expect(draftSkirtBlock({ card, style: {}, rules: balanced }).style.seat).toBeCloseTo(15, 9);
  });

  test('the plain quarter rule has front and back alike', () => {
    const [front = 0, back = 0] = dartsOf(middleBody, quarterRule);
    expect(back).toBeCloseTo(front, 0);
  });
});

describe('what no block can be drawn from is refused in words', () => {
  const codes = (refusal: DraftingError) =>
    refusal.problems.map(({ field, code }) => `${field} ${code}`);

  test('a style out of its bounds names the field, both bounds and the remedy, in the maker’s unit', () => {
    const refusal = refusalOf(() => bodice({ ease: { bust: 900 }, shoulderEase: Number.NaN }));
    expect(codes(refusal)).toEqual([
      'style.ease.bust out-of-range',
      'style.shoulderEase not-a-number',
    ]);
    const [first] = refusal.problems;
    expect(first && speak(first.said, 'cm')).toBe(
      'Ease at the bust 90.0 cm must lie between 2.0 cm and 16.0 cm on this body: change it, or leave it open.',
    );
    expect(codes(refusalOf(() => skirt({ length: 100 })))).toEqual(['style.length out-of-range']);
  });

  test('a card out of its bounds is refused before anything is drawn', () => {
    const refusal = refusalOf(() => bodice({}, { ...middleBody, bustGirth: 92 }));
    expect(codes(refusal)).toContain('card.bustGirth out-of-range');
  });
});
