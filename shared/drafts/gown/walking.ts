import type { Body } from '../../body/card.ts';
import type { BodyLevels } from '../../body/levels.ts';
import { measureGuide } from '../../body/measure-guide.ts';
import type { PartTable } from '../../drafting/drafting-table.ts';
import { taken } from '../../drafting/quantity.ts';
import { type Said, mm, said } from '../../units/said.ts';
import type { GownStyle } from './style-card.ts';

/** The hip joint lies at this part of waist to hip under the waist [named estimate, method section 6]. */
const hipJointShare = 0.8;
/** A shorter step than this is a caution, in plain words. */
const easyStep = 600;

/** What the knee line lets the wearer do. */
export type Walking = { readonly step: number; readonly caution: boolean; readonly said: Said };

/**
 * Longest step, mm, for a skirt of girth `skirt` at depth k below the hip joint: the knees open by
 * d = step x k / leg, and the skirt must reach round both, 2 d + one knee.
 * Source: derived, common practice (hobble-skirt formula); not tried on a person.
 */
export const longestStep = (skirt: number, knee: number, leg: number, depth: number): number =>
  Math.max(0, ((skirt - knee) / 2) * (leg / depth));

/** What opens with the step where the skirt has no seam at the knee. */
const opensBelow: { readonly [F in GownStyle['flare']]: string } = {
  circle: '',
  aLine: '',
  godets: ' Below the knee the godets open with the step.',
  integral: ' Below the knee the seams run out and open with the step.',
};

/** The step the knee line allows, stated on every gown. */
export function walking(
  paper: PartTable,
  body: Body,
  levels: BodyLevels,
  kneeLine: number,
  { kneeFinished, flare }: Pick<GownStyle, 'kneeFinished' | 'flare'>,
): Walking {
  const joint = levels.waist + hipJointShare * (levels.hip - levels.waist);
  const step = longestStep(
    kneeFinished,
    body.measures.kneeGirth,
    levels.floor - joint,
    kneeLine - joint,
  );
  const caution = step < easyStep;
  const of = ['kneeGirth', 'waistToHip', 'waistToFloor'] as const;
  const sentence = said`Finished knee ${mm(kneeFinished)} lets her step about ${mm(step, of)}.${opensBelow[flare]}${
    caution ? ' Stairs, kerbs and getting into a car need care: try it at the fitting.' : ''
  }`;
  const [knee, waistToHip, waistToFloor] = of.map(
    (key) => taken(measureGuide[key].label, key, body.measures[key], key in body.estimated).how,
  );
  paper.draw(
    'Walking',
    said`${knee ?? []}; ${waistToHip ?? []}; ${waistToFloor ?? []}. ${sentence}`,
    {
      why: said`The knees open as the foot goes forward, and the gown must reach round both there. An unhurried step is about ${mm(650)}. Between hip and knee line the side falls in: tape round both thighs together there, seated and standing, against the toile.`,
      measures: of,
    },
  );
  return { step, caution, said: sentence };
}
