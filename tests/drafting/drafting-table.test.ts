import { describe, expect, it } from 'vitest';
import { openTable } from '#shared/drafting/drafting-table.ts';
import { plus, quarterOf, taken, worked } from '#shared/drafting/quantity.ts';
import { speak } from '#shared/units/speak.ts';

describe('a quantity', () => {
  const bust = taken('bust', 'bustGirth', 920, false);

  it('keeps its arithmetic in words', () => {
    const quarter = plus(quarterOf(plus(bust, 'ease', 20)), 'balance', -10);
    expect(quarter.value).toBe(225);
    expect(speak(worked(quarter), 'cm')).toBe(
      'a quarter of (bust 92.0 cm + ease 2.0 cm) = 23.5 cm − balance 1.0 cm = 22.5 cm',
    );
  });

  it('does not say a sum twice where nothing is added', () => {
    expect(speak(worked(plus(quarterOf(bust), 'balance', 0)), 'cm')).toBe(
      'a quarter of (bust 92.0 cm) = 23.0 cm',
    );
  });

  it('says where a measure is an estimate', () => {
    expect(speak(taken('top hip', 'topHipGirth', 900, true).how, 'cm')).toContain('(estimated)');
  });
});

describe('the drafting table', () => {
  it('records what it draws, in order, with its points, lines and measures', () => {
    const table = openTable();
    const paper = table.part('Front', 'front');
    const end = paper.squareAcross(
      'Bust line',
      263,
      quarterOf(taken('bust', 'bustGirth', 920, false)),
    );
    expect(end).toEqual({ x: 230, y: 263 });
    const [step] = table.steps;
    expect(step).toMatchObject({
      id: 'front/bust-line',
      part: 'Front',
      side: 'front',
      measures: ['bustGirth'],
    });
    expect(step?.points['bust-line']).toEqual(end);
    expect(step?.lines).toHaveLength(1);
    expect(speak(step?.said ?? [], 'in')).toContain('36');
  });

  it('starts clean every time', () => {
    openTable().part('Levels', 'both').level('Bust', ['hangs'], 260, []);
    expect(openTable().steps).toHaveLength(0);
  });
});
