import { allowancesOf } from '../drafting/edge-allowance.ts';
import { formatWithUnit } from '../units/format-length.ts';
import type { Unit } from '../units/said.ts';
import { speak } from '../units/speak.ts';
import type { Drafted } from '../engine/drafted.ts';
import { garmentTitles } from './garment-titles.ts';
import { pieceSvg } from './piece-svg.ts';
import { spread } from './spread.ts';
import { element, escapeXml } from './xml.ts';

/** Height of the foot under the pieces that carries the legend, mm. */
const foot = 30;

/** The legend: scale, what the lines mean, and the allowances in the reader's unit. */
function legend(draft: Drafted, unit: Unit): readonly string[] {
  const allowances = allowancesOf(draft.pieces, draft.inputs.rules)
    .map(({ name, wide }) => `${name} ${formatWithUnit(wide, unit)}`)
    .join(', ');
  return [
    `Draft ${draft.number} · print at 100 % · cut on the solid line, sew on the dashed line`,
    `Allowances drawn: ${allowances} · half pieces lie on the fold, pairs are drawn once`,
  ];
}

/**
 * All pieces of a draft as one SVG by the contract of the README: one unit is 1 mm, pieces beside each
 * other, each in its own coordinates under one shift. Text is escaped; `unit` words the legend.
 */
export function piecesSvg(draft: Drafted, unit: Unit): string {
  const { placed, width, height } = spread(draft.pieces);
  const whole = height + foot;
  const [w, h] = [width, whole].map((each) => Math.ceil(each));
  const body = [
    `<title>${escapeXml(`${garmentTitles[draft.garment]}, draft ${draft.number}`)}</title>`,
    `<desc>${escapeXml(speak('walking' in draft ? draft.walking.said : draft.proof.verdict, unit))}</desc>`,
    ...placed.map(({ piece, translate }) => pieceSvg(piece, translate)),
    ...legend(draft, unit).map((text, line) =>
      element(
        'text',
        { class: 'legend', x: 20, y: height + 8 * (line + 1), 'font-size': 5, fill: '#5B6A72' },
        escapeXml(text),
      ),
    ),
  ];
  return `<?xml version="1.0" encoding="UTF-8"?>\n${element(
    'svg',
    {
      xmlns: 'http://www.w3.org/2000/svg',
      width: `${w ?? 0}mm`,
      height: `${h ?? 0}mm`,
      viewBox: `0 0 ${w ?? 0} ${h ?? 0}`,
      'font-family': "'Source Sans 3', 'Helvetica Neue', Arial, sans-serif",
    },
    `\n${body.join('\n')}\n`,
  )}\n`;
}
