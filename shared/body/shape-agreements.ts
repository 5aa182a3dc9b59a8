import { mm, said } from '../units/said.ts';
import { error, type Problem } from '../units/problem.ts';
import type { Body, MeasureKey } from './card.ts';
import { measureGuide } from './measure-guide.ts';

/** How far a girth between two others may stand outside both before the outline would turn back on itself (our rule). */
const outside = 60;

const label = (key: MeasureKey): string => measureGuide[key].label.toLowerCase();

/** A measured girth that lies between two levels must lie between their girths, near enough. */
function between(
  body: Body,
  key: 'topHipGirth' | 'waistSeamGirth',
  above: 'waistGirth' | 'underbustGirth',
  below: 'waistGirth' | 'hipGirth',
): readonly Problem[] {
  const girth = body.measures[key];
  const least = Math.min(body.measures[above], body.measures[below]) - outside;
  const most = Math.max(body.measures[above], body.measures[below]) + outside;
  if (key in body.estimated || (girth >= least && girth <= most)) return [];
  return [
    error({
      code: 'disagree',
      field: `card.${key}`,
      with: [`card.${above}`, `card.${below}`],
      said: said`${measureGuide[key].label} ${mm(girth)} does not fit between ${label(above)} ${mm(body.measures[above])} and ${label(below)} ${mm(body.measures[below])}: it must lie between ${mm(least)} and ${mm(most)}. Measure all three again.`,
    }),
  ];
}

/** The armpit line, taken from the waist up, may not lie far above the bust point (160: our rule). */
function underarm(body: Body): readonly Problem[] {
  const { underarmToWaist, frontWaistLength, sideNeckToBustPoint } = body.measures;
  const most = frontWaistLength - sideNeckToBustPoint + 160;
  if (underarmToWaist <= most || 'underarmToWaist' in body.estimated) return [];
  return [
    error({
      code: 'disagree',
      field: 'card.underarmToWaist',
      with: ['card.frontWaistLength', 'card.sideNeckToBustPoint'],
      said: said`Underarm to waist ${mm(underarmToWaist)} is too long beside front waist length ${mm(frontWaistLength)} and side neck to bust point ${mm(sideNeckToBustPoint)}: it may be at most ${mm(most)}. Measure all three again.`,
    }),
  ];
}

/** Agreements among three measures, errors only. */
export const shapeProblems = (body: Body): readonly Problem[] => [
  ...between(body, 'waistSeamGirth', 'underbustGirth', 'waistGirth'),
  ...between(body, 'topHipGirth', 'waistGirth', 'hipGirth'),
  ...underarm(body),
];
