import { describe, expect, it } from 'vitest';
import { atCentreWaist } from '#shared/compare/alignment.ts';
import { DraftingError } from '#shared/drafting/drafting-error.ts';
import { balanced } from '#shared/drafting/house-rule-presets.ts';
import { type Drafted, draftAny } from '#shared/engine/drafted.ts';
import { add, point } from '#shared/geometry/point.ts';
import { checkGradeRules, mostSizes, starterRules, stepCard } from '#shared/regrade/grade-rules.ts';
import { nestReport } from '#shared/regrade/nest-report.ts';
import { type Nest, nestOf, sizeLabel } from '#shared/regrade/nest.ts';
import { settledCounts } from '#shared/regrade/settled-counts.ts';
import { fixedDepths } from '#shared/regrade/style-depths.ts';
import { middleBody } from '../support/middle-body.ts';
import { moveSeamPoint, withPiece } from '../support/tamper.ts';

const base = draftAny({ card: middleBody, style: { kneeFinished: 800 }, rules: balanced });
const order = { rules: starterRules, smaller: 2, larger: 3, depths: fixedDepths };

const girth = (draft: Drafted, level: string): number =>
  draft.proof.girths.find((each) => each.level === level)?.pieces ?? Number.NaN;

const sizeOf = ({ sizes }: Nest, step: number): Drafted => {
  const size = sizes.find((each) => each.step === step);
  if (!size) throw new Error(`no size ${step}`);
  return size.draft;
};

describe('a nest', () => {
  const nest = nestOf(base, order);

  it('worked by hand: bust 92 and waist 73 in steps of 4, eased as on the card', () => {
    // Bust 920, ease 0: 840, 880, 920, 960, 1000, 1040. Waist 730, ease -10: 640 to 840. Hip 990, ease 20: 930 to 1130.
    expect(nest.sizes.map(({ step }) => step)).toEqual([-2, -1, 0, 1, 2, 3]);
    const by = (level: string) => nest.sizes.map(({ draft }) => girth(draft, level));
    const near = (level: string, wanted: readonly number[]) =>
      by(level).forEach((each, k) =>
        expect(Math.abs(each - (wanted[k] ?? Number.NaN))).toBeLessThan(0.5),
      );
    near('bust', [840, 880, 920, 960, 1000, 1040]);
    near('waist', [640, 680, 720, 760, 800, 840]);
    near('hip', [930, 970, 1010, 1050, 1090, 1130]);
    // The knee seam is the style's own 800 in every size.
    near('knee-seam', [800, 800, 800, 800, 800, 800]);
    expect(nest.sizes.every(({ draft }) => draft.proof.holds)).toBe(true);
  });

  it('has its card’s own size as it was drawn', () => {
    expect(sizeOf(nest, 0).pieces.map(({ cutLine }) => cutLine)).toEqual(
      base.pieces.map(({ cutLine }) => cutLine),
    );
  });

  it('takes its darts and gores from its largest size', () => {
    // A waist that grows less than hip and bust needs a second dart in the largest size only.
    const rules = { ...starterRules, waistGirth: 5, underbustGirth: 30 };
    const alone = (step: number) =>
      settledCounts(
        draftAny({
          ...base.inputs,
          card: stepCard(middleBody, rules, step, base.body.measures),
        }).pieces,
      );
    expect(alone(0).darts?.back).toBe(1);
    expect(alone(3).darts?.back).toBe(2);
    const settled = nestOf(base, { ...order, rules, smaller: 0 });
    for (const { draft } of settled.sizes) {
      expect(settledCounts(draft.pieces)).toEqual(alone(3));
      expect(draft.proof.holds).toBe(true);
    }
    expect(nestReport(settled, atCentreWaist).unlike).toEqual([]);
  });

  it('lists a point that lies more than 1.5 off the straight line, and none that lies nearer', () => {
    const tampered = (off: number): Nest => ({
      ...nest,
      sizes: nest.sizes.map((size) => {
        if (size.step !== 0) return size;
        const corner = size.draft.pieces.find(({ name }) => name === 'front-middle')?.edges[0];
        const place = corner?.path[0]?.from ?? point(0, 0);
        const pieces = withPiece(size.draft.pieces, 'front-middle', (piece) =>
          moveSeamPoint(piece, place, add(point(0, 0), point(off, 0))),
        );
        return { ...size, draft: { ...size.draft, pieces } };
      }),
    });
    const listed = (of: Nest) =>
      nestReport(of, atCentreWaist).off.filter(({ piece }) => piece === 'front-middle');
    expect(listed(nest)).toEqual([]);
    expect(listed(tampered(1))).toEqual([]);
    expect(listed(tampered(3))).toMatchObject([{ step: 0 }]);
    expect(listed(tampered(3))[0]?.off).toBeCloseTo(3, 0);
  });

  it('names a size that cannot be drawn, and draws the others', () => {
    const nest = nestOf(base, { ...order, smaller: 6, larger: 0 });
    expect(nest.refused.map(({ step }) => step)).toContain(-6);
    expect(nest.refused[0]?.problems[0]?.field).toBe('card.underbustGirth');
    expect(nest.sizes.at(-1)?.step).toBe(0);
  });

  it('names a depth a size cannot wear, and gives it the nearest', () => {
    const held = nest.sizes.flatMap(({ step, held }) => held.map((each) => ({ step, ...each })));
    expect(held).toContainEqual(
      expect.objectContaining({ step: 3, key: 'backDepth', wanted: 180 }),
    );
    expect(held.every(({ step }) => step > 0)).toBe(true);
  });

  it('grows a depth that is marked in proportion to side neck to bust point', () => {
    const depths = { ...fixedDepths, topDrop: 'proportional' } as const;
    const { style } = sizeOf(nestOf(base, { ...order, depths }), 2).inputs;
    // 265 to 275: ten millimetres on.
    const grown = 'topDrop' in style ? (style.topDrop ?? 0) : Number.NaN;
    const drawn = base.garment === 'gown' ? base.style.topDrop : Number.NaN;
    expect(grown).toBeCloseTo((drawn * 275) / 265, 2);
  });

  it('is refused beyond twelve sizes, or with a step no size could have', () => {
    const tooMany = { ...order, smaller: 6, larger: mostSizes - 6 };
    expect(() => nestOf(base, tooMany)).toThrow(DraftingError);
    expect(checkGradeRules({ bustGirth: 400 })).toMatchObject([
      { field: 'gradeRules.bustGirth', code: 'out-of-range' },
    ]);
    expect(checkGradeRules({ bustGirth: Number.NaN })[0]?.code).toBe('not-a-number');
  });

  it('letters its sizes by steps from the card', () => {
    expect([-2, 0, 3].map(sizeLabel)).toEqual(['\u22122', 'base', '+3']);
  });
});
