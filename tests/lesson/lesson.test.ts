import { describe, expect, test } from 'vitest';
import { balanced } from '#shared/drafting/house-rule-presets.ts';
import type { Step } from '#shared/drafting/step.ts';
import { draftGown } from '#shared/engine/draft-gown.ts';
import { classCopy } from '#shared/lesson/class-copy.ts';
import { contents } from '#shared/lesson/contents.ts';
import { placeNames } from '#shared/lesson/place-names.ts';
import { placeOf, sameStep } from '#shared/lesson/same-step.ts';
import { sourceSaid, spoken } from '#shared/lesson/spoken.ts';
import { stepPicture } from '#shared/lesson/step-picture.ts';
import { said } from '#shared/units/said.ts';
import { speak } from '#shared/units/speak.ts';
import { middleBody } from '../support/middle-body.ts';

const draft = draftGown({ card: middleBody, style: {}, rules: balanced });
const at = (id: string): number => {
  const place = draft.steps.findIndex((each) => each.id === id);
  expect(place, id).toBeGreaterThanOrEqual(0);
  return place;
};
const picture = (id: string) => {
  const found = stepPicture(draft, at(id));
  if (!found) throw new Error(`${id} has no picture`);
  return found;
};

describe('the contents of a lesson', () => {
  test('name each part where it is taken up, and lose no step', () => {
    const chapters = contents(draft.steps);
    expect(chapters[0]?.part).toBe('Levels');
    expect(chapters.flatMap(({ steps }) => steps)).toEqual(draft.steps);
    for (const { from, steps } of chapters) expect(draft.steps[from]).toBe(steps[0]);
  });
});

describe('the picture of a step', () => {
  test('shows its own lines as new and those before it as old, in its own half alone', () => {
    const back = picture('back/bust-line');
    expect(back.frame).toBe('back');
    expect(back.now).toBe(draft.steps[at('back/bust-line')]?.lines);
    const frontLines = draft.steps.filter(({ side }) => side === 'front').flatMap((s) => s.lines);
    for (const path of frontLines) expect(back.before).not.toContain(path);
    const levels = draft.steps.filter(({ part }) => part === 'Levels').flatMap((s) => s.lines);
    for (const path of levels) expect(back.before).toContain(path);
  });

  test('shows the panels of the top once the princess seam is drawn, and not before', () => {
    expect(picture('front/top-line').cut).toEqual([]);
    const cut = picture('front/princess-seam').cut;
    expect(cut.map(({ piece, now }) => [piece.name, now])).toEqual([
      ['front-top-centre', true],
      ['front-top-side', true],
    ]);
    expect(picture('front/skirt').cut.map(({ now }) => now)).toEqual([false, false, true]);
  });

  test('of the last step is about the pieces, and there is none beyond it', () => {
    expect(stepPicture(draft, draft.steps.length - 1)?.frame).toBe('pieces');
    expect(stepPicture(draft, draft.steps.length)).toBeUndefined();
  });
});

describe('where a number comes from', () => {
  const parts = (id: string) => {
    const step = draft.steps[at(id)];
    if (!step) throw new Error('no such step');
    return spoken(step.said, step, draft.body).flatMap((p) => (typeof p === 'string' ? [] : [p]));
  };

  test('a measure is told by name and whether it was taken', () => {
    const [bust, quarter, balance] = parts('front/bust-line');
    expect(bust?.from).toBe('measure');
    expect(bust && speak(sourceSaid(bust), 'cm')).toBe('Bust 92.0 cm (taken)');
    expect(quarter?.from).toBe('measures');
    expect(quarter && speak(sourceSaid(quarter), 'in')).toBe(
      'Worked out from Bust 36\u00a01\u20444 in (taken)',
    );
    expect(balance?.from).toBe('elsewhere');
  });

  test('an estimate says by which rule', () => {
    const [neck] = parts('levels/side-neck-point');
    expect(neck && speak(sourceSaid(neck), 'cm')).toMatch(
      /^Neck 36\.8 cm \(estimated: from the bust, after ASTM/,
    );
  });
});

describe('the same step of another body', () => {
  const step = (id: string): Step => ({
    id,
    part: 'Front',
    title: id,
    said: said`x`,
    points: {},
    lines: [],
    side: 'front',
    measures: [],
  });
  const tutors = ['a', 'b', 'c'].map(step);

  test('is the one of that name, or the last both have before it', () => {
    expect(sameStep(tutors, 1, ['x', 'a', 'b'].map(step))).toEqual({ place: 2, exact: true });
    expect(sameStep(tutors, 2, ['a', 'b'].map(step))).toEqual({ place: 1, exact: false });
    expect(sameStep(tutors, 2, [step('z')])).toEqual({ place: 0, exact: false });
  });

  test('an address of no step leads to the first', () => {
    expect(placeOf(tutors, 'c')).toBe(2);
    expect(placeOf(tutors, 'none')).toBe(0);
    expect(placeOf(tutors, undefined)).toBe(0);
  });
});

test('a copy for a class has the measures and nothing else of the card', () => {
  const card = {
    ...middleBody,
    neckGirth: 360,
    overruled: [{ code: 'girth', field: 'card.waistGirth', reason: 'Anna said so' }],
  };
  const copy = classCopy({ garment: 'gown', card, style: { heelHeight: 60 }, rules: balanced });
  expect(JSON.stringify(copy)).not.toMatch(/Test body|2026-11-14|Anna/);
  expect(copy.card.neckGirth).toBe(360);
  expect(copy.card.bustGirth).toBe(middleBody.bustGirth);
  expect(copy.style).toEqual({ heelHeight: 60 });
});

test('names on a drawing keep clear of each other, this step’s before all', () => {
  const room = { width: 300, height: 200, letters: 14 };
  const named = (name: string, y: number, now: boolean) => ({ name, at: { x: 0, y }, now });
  const placed = placeNames(
    [named('bust', 50, false), named('underarm', 52, false), named('new bust line', 51, true)],
    ({ x, y }) => ({ x: x + 20, y }),
    room,
  );
  expect(placed[0]?.name).toBe('new bust line');
  for (const [i, one] of placed.entries()) {
    for (const other of placed.slice(i + 1)) {
      expect(Math.abs(one.y - other.y)).toBeGreaterThanOrEqual(14);
    }
  }
  const outside = placeNames([named('off', 400, true)], (p) => p, room);
  expect(outside).toEqual([]);
});
