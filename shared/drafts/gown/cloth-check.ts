import type { Body } from '../../body/card.ts';
import { mm, said } from '../../units/said.ts';
import { type Problem, error, warning } from '../../units/problem.ts';
import { type GownStyle, isOffShoulder } from './style-card.ts';

/** How much more cloth is bought for what it will lose, per cent: cut length is length over 1 - s (reference.md 6, common practice). */
export const moreForShrinking = (shrinkage: number): number =>
  (1 / (1 - shrinkage / 100) - 1) * 100;

/**
 * What the cloth asks of whoever cuts it. The pieces are not made larger for shrinking: cloth is washed or
 * pressed before it is cut, as it never shrinks alike along and across.
 */
export const aboutCloth = ({ shrinkage }: GownStyle): readonly Problem[] =>
  shrinkage === 0
    ? []
    : [
        warning({
          code: 'shrinks',
          field: 'style.shrinkage',
          said: said`The cloth loses ${plain(shrinkage)} %: wash or press it as the gown will be before cutting, and buy ${plain(moreForShrinking(shrinkage))} % more than the pieces take. They are not drawn larger for it.`,
        }),
      ];

const plain = (per: number): string => String(Number(per.toFixed(1)));

/**
 * A side zip opens the gown below the arms only: bands round both arms stay closed with the upper edge, and
 * what is closed all round must pass the hips from below or the shoulders from above.
 */
export function closedEdge(body: Body, style: GownStyle): readonly Problem[] {
  if (style.closure !== 'sideZip' || !isOffShoulder(style)) return [];
  const { hipGirth, shoulderGirth } = body.measures;
  const edge = shoulderGirth + style.armEase;
  const least = Math.min(hipGirth, shoulderGirth);
  if (edge >= least) return [];
  return [
    error({
      code: 'closed-edge-too-narrow',
      field: 'style.closure',
      with: ['style.sleeve', 'style.armEase'],
      said: said`With a side zip and bands round the arms the upper edge stays closed all round, ${mm(edge)}, and must pass ${mm(least)} to be put on: give the bands ${mm(least - shoulderGirth)} of arm ease or more, or close the gown at the centre back.`,
    }),
  ];
}
