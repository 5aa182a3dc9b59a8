import { describe, expect, test } from 'vitest';
import { DraftingError } from '#shared/drafting/drafting-error.ts';
import { balanced, quarterRule } from '#shared/drafting/house-rule-presets.ts';
import type { Piece } from '#shared/drafting/piece.ts';
import type { StyleCard } from '#shared/drafts/gown/style-card.ts';
import { draftGown } from '#shared/engine/draft-gown.ts';
import type { Draft } from '#shared/engine/draft.ts';
import { distance } from '#shared/geometry/point.ts';
import { speak } from '#shared/units/speak.ts';
import { middleBody } from '../../support/middle-body.ts';

const drafted = (style: StyleCard): Draft =>
  draftGown({ card: middleBody, style, rules: balanced });

const named = ({ pieces }: Draft, name: string): Piece => {
  const found = pieces.find((piece) => piece.name === name);
  if (!found) throw new Error(`no piece ${name}`);
  return found;
};

const stepOf = ({ steps }: Draft, title: string): string => {
  const found = steps.find((step) => step.title === title);
  if (!found) throw new Error(`no step ${title}`);
  return speak(found.said, 'cm');
};

describe('a zip in the centre back', () => {
  const draft = drafted({ closure: 'centreBackZip' });

  test('ends 2 cm above the hip and says what to buy, 2.5 cm longer than the opening', () => {
    const end = named(draft, 'back-middle').notches.find(({ name }) => name === 'zip-end');
    expect(draft.levels.hip - (end?.at.y ?? 0)).toBeCloseTo(20, 6);
    const top = named(draft, 'back-top-centre').edges.find(({ name }) => name === 'centre');
    const opening = (end?.at.y ?? 0) - (top?.path.at(-1)?.to.y ?? 0);
    const bought = Number(/Buy a zip of ([\d.]+) cm/.exec(stepOf(draft, 'Zip'))?.[1]) * 10;
    expect(bought - opening).toBeGreaterThanOrEqual(25);
    expect(bought - opening).toBeLessThan(35);
  });

  test('ends lower where the gown would not pass the hips so high up', () => {
    const tight = drafted({ ease: { hip: 0 } });
    const end = named(tight, 'back-middle').notches.find(({ name }) => name === 'zip-end');
    expect(tight.levels.hip - (end?.at.y ?? 0)).toBeLessThan(20);
    expect(tight.proof.holds).toBe(true);
  });
});

describe('a zip in the side seam', () => {
  const draft = drafted({ closure: 'sideZip' });

  test('is marked on front and back at the same length, and the centre back lies on the fold', () => {
    expect(draft.proof.holds).toBe(true);
    for (const name of ['front-middle', 'back-middle']) {
      const marks = named(draft, name).notches.filter(({ name: mark }) => mark === 'zip-end');
      expect(marks.map(({ edge }) => edge)).toEqual(['side']);
    }
    for (const name of ['back-top-centre', 'back-middle']) {
      const piece = named(draft, name);
      expect(piece.edges.find(({ name: edge }) => edge === 'centre')?.kind).toBe('fold');
      expect(piece.cut).toBe('cut 1 on fold');
    }
  });

  test('takes the zip’s allowance down both sides', () => {
    for (const { edges } of draft.pieces.filter(({ part }) => part === 'top' || part === 'middle'))
      for (const edge of edges.filter(({ name }) => name === 'side')) expect(edge.kind).toBe('zip');
  });

  test('leaves the centre back a seam where it runs outwards below the knee', () => {
    const flared = drafted({ closure: 'sideZip', flare: 'integral', train: 300 });
    const back = named(flared, 'back-middle').edges.find(({ name }) => name === 'centre');
    expect(back?.kind).toBe('seam');
    expect(flared.proof.holds).toBe(true);
  });

  test('is refused with bands that hold the arms in, both choices and the nearest that can named', () => {
    const refused = (): Draft => drafted({ closure: 'sideZip', sleeve: 'plainBand', armEase: -40 });
    expect(refused).toThrow(DraftingError);
    try {
      refused();
    } catch (error) {
      if (!(error instanceof DraftingError)) throw error;
      const [problem] = error.problems;
      expect([problem?.field, ...(problem?.with ?? [])]).toEqual([
        'style.closure',
        'style.sleeve',
        'style.armEase',
      ]);
      expect(speak(problem?.said ?? [], 'cm')).toContain('close the gown at the centre back');
    }
  });
});

describe('a laced back', () => {
  const draft = drafted({ closure: 'laced' });

  test('has its gap counted in every girth', () => {
    expect(draft.proof.holds).toBe(true);
    const zipped = drafted({});
    for (const level of ['bust', 'underbust', 'waist'] as const) {
      expect(draft.construction.gaps?.[level]).toBeCloseTo(50, 6);
      const row = (of: Draft) => of.proof.girths.find((each) => each.level === level)?.pieces ?? 0;
      expect(row(draft)).toBeCloseTo(row(zipped), 6);
    }
    expect(draft.construction.gaps?.hip).toBeUndefined();
    const seam = draft.construction.gaps?.['waist-seam'] ?? 0;
    expect(seam).toBeGreaterThanOrEqual(50);
    expect(seam).toBeLessThan(50.2);
  });

  test('has eyelets at an even pitch of 25 mm at most, and a bone on either side of them', () => {
    for (const name of ['back-top-centre', 'back-middle']) {
      const { drills, darts, lines } = named(draft, name);
      const eyelets = drills.slice(darts.length);
      const apart = eyelets.slice(1).map((at, k) => distance(eyelets[k] ?? at, at));
      expect(Math.max(...apart)).toBeLessThanOrEqual(25.01);
      expect(Math.max(...apart) - Math.min(...apart)).toBeLessThan(0.1);
      expect(lines?.filter(({ kind }) => kind === 'boning')).toHaveLength(2);
    }
  });

  test('has a panel behind that reaches 5 cm under either edge and below its end', () => {
    const { edges, part } = named(draft, 'modesty-panel');
    expect(part).toBe('inner');
    const xs = edges.flatMap(({ path }) => path.map(({ to }) => to.x));
    expect(Math.max(...xs)).toBe(75);
    const foot = Math.max(...edges.flatMap(({ path }) => path.map(({ to }) => to.y)));
    const end = named(draft, 'back-middle').notches.find(({ name }) => name === 'lace-end');
    expect(foot - (end?.at.y ?? 0)).toBeCloseTo(30, 6);
  });

  test('stands nearer together on a narrow back, so that its bones keep their cloth', () => {
    const narrow = draftGown({
      card: { ...middleBody, bustGirth: 800, underbustGirth: 580, waistGirth: 540, hipGirth: 900 },
      style: { closure: 'laced' },
      rules: quarterRule,
    });
    const gap = narrow.construction.gaps?.underbust ?? 0;
    expect(gap).toBeGreaterThanOrEqual(20);
    expect(gap).toBeLessThan(50);
    expect(narrow.proof.holds).toBe(true);
    expect(stepOf(narrow, 'Lacing')).toContain(`stand ${(gap / 10).toFixed(1)} cm apart`);
  });

  test('says that lacing must allow a full breath', () => {
    const why = draft.steps.find(({ title }) => title === 'Lacing')?.why ?? [];
    expect(speak(why, 'cm')).toContain('full breath');
  });
});
