import { describe, expect, it } from 'vitest';
import { atCentreWaist } from '#shared/compare/alignment.ts';
import { balanced } from '#shared/drafting/house-rule-presets.ts';
import { draftAny } from '#shared/engine/drafted.ts';
import { changedMeasures, regradeTo } from '#shared/regrade/what-moved.ts';
import { fixedDepths } from '#shared/regrade/style-depths.ts';
import { middleBody } from '../support/middle-body.ts';

const before = draftAny({ card: middleBody, style: {}, rules: balanced });
const card = { ...middleBody, date: '2027-11-20', waistGirth: 760, hipGirth: 1010 };

describe('a gown redrawn a year later', () => {
  const { figures, points, causes, after } = regradeTo(before, card, fixedDepths, atCentreWaist);
  const figure = (key: string) => figures.find((each) => each.key === key);

  it('names the measures that changed, whatever the day', () => {
    expect(causes).toEqual([
      { measure: 'waistGirth', from: 730, to: 760 },
      { measure: 'hipGirth', from: 990, to: 1010 },
    ]);
    expect(changedMeasures(card, card)).toEqual([]);
    expect(after.inputs.card.date).toBe('2027-11-20');
  });

  it('says of a girth which measure moved it', () => {
    expect(figure('girth:waist')?.by).toMatchObject([{ measure: 'waistGirth' }]);
    expect(figure('girth:waist')?.by[0]?.change).toBeCloseTo(30, 3);
    expect(figure('girth:hip')?.by[0]?.change).toBeCloseTo(20, 3);
    // Between the two the tape is moved by both.
    expect(figure('girth:top-hip')?.by.map(({ measure }) => measure)).toEqual(
      expect.arrayContaining(['waistGirth', 'hipGirth']),
    );
    expect(figure('girth:bust')).toBeUndefined();
  });

  it('says of a point which measure moves it farthest', () => {
    const hem = points.find(({ key }) => key === 'tip:front-middle:waist');
    expect(hem?.by[0]?.measure).toBe('waistGirth');
  });

  it('tells a measure that cannot change alone from one that can', () => {
    // An under-bust of 95 under the old bust of 92 is no body: the bust has to come with it.
    const fuller = {
      ...middleBody,
      bustGirth: 1100,
      underbustGirth: 950,
      waistGirth: 900,
      hipGirth: 1120,
    };
    const told = regradeTo(before, fuller, {}, atCentreWaist);
    const stuck = told.causes.filter(({ problems }) => problems !== undefined);
    expect(stuck.length).toBeGreaterThan(0);
    expect(stuck.map(({ measure }) => measure)).toContain('underbustGirth');
    const bust = told.figures.find(({ key }) => key === 'girth:bust');
    expect((bust?.second ?? 0) - (bust?.first ?? 0)).toBeCloseTo(180, 3);
  });
});
