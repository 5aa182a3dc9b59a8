import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { completeCard } from '#shared/body/complete-card.ts';
import { balanced } from '#shared/drafting/house-rule-presets.ts';
import { resolveStyle } from '#shared/drafts/gown/resolve-style.ts';
import type { StyleCard } from '#shared/drafts/gown/style-card.ts';
import { checkStyle } from '#shared/drafts/gown/style-check.ts';
import { styleKeys, styleLimits } from '#shared/drafts/gown/style-limits.ts';
import { draftGown } from '#shared/engine/draft-gown.ts';
import type { Unit } from '#shared/units/said.ts';
import { speak } from '#shared/units/speak.ts';
import { middleBody } from '../../support/middle-body.ts';
import { plainLevels } from '../../support/plain-levels.ts';
import { bodyArbitrary } from '../../support/random-body.ts';
import { styleDraws, styleOn } from '../../support/random-style.ts';

const body = completeCard(middleBody);
const levels = plainLevels(body);
const heard = (style: StyleCard, unit: Unit = 'cm'): readonly string[] =>
  checkStyle(style, body, levels).map(
    (each) => `${each.severity} ${each.field}: ${speak(each.said, unit)}`,
  );

describe('the limits of a style', () => {
  it('stand in order on every body, with the initial value between them', () => {
    fc.assert(
      fc.property(bodyArbitrary, (card) => {
        const any = completeCard(card);
        const limits = styleLimits(any, plainLevels(any));
        for (const key of styleKeys) {
          const { min, max, initial } = limits[key];
          expect(min, key).toBeLessThanOrEqual(initial);
          expect(initial, key).toBeLessThanOrEqual(max);
        }
      }),
    );
  });

  it('accept the style with every choice left open, on every body', () => {
    fc.assert(
      fc.property(bodyArbitrary, (card) => {
        const any = completeCard(card);
        const errors = checkStyle({}, any, plainLevels(any)).filter(
          (each) => each.severity === 'error',
        );
        expect(errors).toEqual([]);
      }),
    );
  });

  it('accept every style drawn between them', () => {
    fc.assert(
      fc.property(bodyArbitrary, styleDraws, (card, draws) => {
        const any = completeCard(card);
        const its = plainLevels(any);
        const errors = checkStyle(styleOn(draws, any, its), any, its).filter(
          (each) => each.severity === 'error',
        );
        expect(errors).toEqual([]);
      }),
    );
  });

  it('are those of the method on a middle body', () => {
    const { topDrop, neckDepth, sideDepth, kneeFinished, backDepth } = styleLimits(body, levels);
    expect(topDrop.initial).toBeCloseTo(levels.bust - 85, 9);
    expect(neckDepth.initial).toBeCloseTo(topDrop.initial + 35, 9);
    expect(sideDepth.initial).toBeCloseTo(Math.min(levels.underarm + 10, levels.bust - 15), 9);
    expect(backDepth.min).toBe(180);
    expect(kneeFinished.initial).toBe(762);
    // reference.md section 5 no. 33: both knees of G 36 together are 58.9 cm (derived); + 40 mm to stand in
    const knees = completeCard({ ...middleBody, kneeGirth: 360 });
    expect(styleLimits(knees, levels).kneeFinished.min).toBe(Math.ceil(589.18 + 40));
    const measured = completeCard({ ...middleBody, bothKneesGirth: 640 });
    expect(styleLimits(measured, levels).kneeFinished.min).toBe(680);
  });

  it('move with the choice they hang on', () => {
    const deep = styleLimits(body, levels, { topDrop: levels.bust - 70 });
    expect(deep.neckDepth.min).toBeCloseTo(levels.bust - 70, 9);
    const heels = styleLimits(body, levels, { heelHeight: 100 });
    expect(heels.flareLength.max - styleLimits(body, levels).flareLength.max).toBeCloseTo(50, 9);
  });
});

describe('a style card filled up', () => {
  it('keeps what is given, and a given flare length decides how high the hem hangs', () => {
    const style = resolveStyle(
      { flareLength: 500, shaping: 'darts', ease: { bust: 12 } },
      body,
      levels,
    );
    expect(style.floorClearance).toBeCloseTo(levels.floor - levels.knee + 100 + 50 - 500, 9);
    expect(style).toMatchObject({ flareLength: 500, shaping: 'darts', kneeFinished: 762 });
    expect(style.ease).toEqual({
      chest: -20,
      bust: 12,
      underbust: -15,
      waist: -10,
      topHip: 5,
      hip: 20,
    });
  });
});

describe('a style that cannot be drawn', () => {
  it('is refused with both bounds in the unit of the maker, and the remedy', () => {
    expect(heard({ neckWidth: 200 })).toEqual([
      'error style.neckWidth: Neck width 20.0 cm must lie between 4.0 cm and 14.0 cm on this body: change it, or leave it open.',
    ]);
    expect(heard({ neckWidth: 200 }, 'in')[0]?.replaceAll('\u00a0', ' ')).toContain(
      '7 7⁄8 in must lie between 1 9⁄16 in and 5 1⁄2 in',
    );
  });

  it('names the other fields its bound hangs on', () => {
    const [problem] = checkStyle({ topDrop: 200, neckDepth: 180 }, body, levels);
    expect(problem).toMatchObject({
      field: 'style.neckDepth',
      with: ['style.topDrop', 'card.sideNeckToBustPoint'],
    });
    expect(heard({ kneeFinished: 600 })[0]).toMatch(/^error style.kneeFinished: .*both knees/);
  });

  it('says only why it is too much, or why it is too little', () => {
    expect(heard({ kneeFinished: 600 })[0]).not.toMatch(/More/);
    expect(heard({ kneeFinished: 1600 })[0]).toMatch(/More would be wider than the hip/);
    expect(heard({ kneeFinished: 1600 })[0]).not.toMatch(/Less/);
    expect(heard({ neckDepth: 100 })[0]).toMatch(/above the peak/);
    expect(heard({ neckDepth: 100 })[0]).not.toMatch(/bust point/);
  });

  it('is refused where ease would make the under-bust the larger', () => {
    const slight = completeCard({ ...middleBody, underbustGirth: 890 });
    const [problem] = checkStyle(
      { ease: { bust: -40, underbust: 80 } },
      slight,
      plainLevels(slight),
    );
    expect(problem).toMatchObject({ code: 'ease-turns-bust', severity: 'error' });
  });

  it('is refused for a value that is no number', () => {
    expect(heard({ dartLength: Number.NaN })[0]).toMatch(
      /^error style.dartLength: Dart length is not a number/,
    );
  });

  it('takes a bound typed as it was shown, though reading rounds it', () => {
    expect(heard({ neckDepth: 242.9 })).toEqual([]);
    expect(heard({ neckDepth: 244 })).toHaveLength(1);
  });
});

describe('a style that is only unlikely', () => {
  it('is drawn, with a warning for a hem that will be stepped on', () => {
    expect(heard({ floorClearance: 5 })[0]).toMatch(/^warning style.floorClearance/);
    expect(
      heard({ flareLength: 600, floorClearance: 20 }).map((each) => each.slice(0, 28)),
    ).toHaveLength(2);
  });

  it('is drawn, with a caution for a knee that shortens the step', () => {
    const slim = completeCard({ ...middleBody, kneeGirth: 320 });
    const problems = checkStyle({ kneeFinished: 580 }, slim, plainLevels(slim));
    expect(problems.map(({ code, severity }) => [code, severity])).toEqual([
      ['narrow-knee', 'warning'],
    ]);
  });
});

describe('the drop of the house', () => {
  it('is the peak where the style card leaves it open, and gives way where it does not', () => {
    const open = draftGown({
      card: middleBody,
      style: {},
      rules: { ...balanced, peakOverBust: 70 },
    });
    expect(open.style.topDrop).toBeCloseTo(open.levels.bust - 70, 9);
    const off = draftGown({
      card: middleBody,
      style: { sleeve: 'plainBand' },
      rules: { ...balanced, shoulderDrop: 140 },
    });
    expect(off.style.topDrop).toBe(140);
    const chosen = { card: middleBody, style: { topDrop: 190 }, rules: balanced };
    expect(draftGown(chosen).style.topDrop).toBe(190);
  });
});
