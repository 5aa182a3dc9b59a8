import { sampleCards } from '#shared/body/sample-cards.ts';
import { draftGown } from '#shared/engine/draft-gown.ts';
import { houseRulePresets } from '#shared/drafting/house-rule-presets.ts';
import type { FinishedPiece } from '#shared/drafting/piece.ts';
import { levelTitles } from '#shared/exports/level-titles.ts';
import { pathData } from '#shared/exports/path-data.ts';
import { spread, type SpreadPiece } from '#shared/exports/spread.ts';

/** Room above and beside the pieces for the rod, mm. */
const margin = 46;

/** A drawing for a width of page: which pieces it shows, and how large its letters are in mm. */
type Sheet = { readonly id: string; readonly flare: boolean; readonly letters: number };

const sheets: readonly Sheet[] = [
  { id: 'gown', flare: true, letters: 26 },
  { id: 'gown-narrow', flare: false, letters: 34 },
];

/**
 * The front page's drawings as an SVG of symbols that take their colours from the page that uses them.
 * Made when the screens are built, so that they are never older than the engine.
 */
export function demoGown(): string {
  const { pieces } = draftGown({
    card: sampleCards.judith,
    style: {},
    rules: houseRulePresets.balanced,
  });
  return [
    '<svg xmlns="http://www.w3.org/2000/svg">',
    ...sheets.map((sheet) => symbol(pieces, sheet)),
    '</svg>\n',
  ].join('\n');
}

function symbol(pieces: readonly FinishedPiece[], { id, flare, letters }: Sheet): string {
  const { placed, width, height } = spread(
    pieces.filter((piece) => piece.part !== 'flare' || (flare && piece.side === 'front')),
  );
  // Names of the levels stand to the right of the pieces.
  const [w, h] = [Math.ceil(width + margin + letters * 5), Math.ceil(height + margin)];
  return [
    `<symbol id="${id}" viewBox="0 0 ${w} ${h}">`,
    levels(placed, w, letters),
    `<g transform="translate(${margin} ${margin})" stroke-linejoin="round">`,
    ...placed.map(drawn),
    ...litSides(placed),
    '</g>',
    `<path fill="none" stroke="var(--brass)" stroke-width="2" d="${rod(w, h)}"/>`,
    '</symbol>',
  ].join('\n');
}

function drawn({ piece, translate }: SpreadPiece): string {
  const seams = piece.edges.map((edge) => pathData(edge.path)).join('');
  const darts = piece.darts.flatMap((dart) => [dart.centreLeg, dart.sideLeg]);
  return [
    `<g transform="translate(${translate.x.toFixed(1)} ${translate.y.toFixed(1)})" fill="none" stroke="currentColor">`,
    `<path fill="var(--paper)" stroke-width="2.6" d="${pathData(piece.cutLine, true)}"/>`,
    `<path stroke-width="1.6" stroke-dasharray="9 6" d="${seams}"/>`,
    `<path stroke-width="1.2" d="${darts.map((leg) => pathData(leg)).join('')}"/>`,
    `<path stroke-width="1.2" d="${pathData([{ kind: 'line', ...piece.grain }])}"/>`,
    '</g>',
  ].join('');
}

/** The side seams of front and back lit as one: what the proof is about. */
const litSides = (placed: readonly SpreadPiece[]): string[] =>
  placed
    .filter(({ piece }) => piece.part === 'middle')
    .flatMap(({ piece, translate }) =>
      piece.edges
        .filter((edge) => edge.name === 'side')
        .map(
          (edge) =>
            `<path fill="none" stroke="var(--verdigris)" stroke-width="6" transform="translate(${translate.x.toFixed(1)} ${translate.y.toFixed(1)})" d="${pathData(edge.path)}"/>`,
        ),
    );

/** The body's levels hang from the rod as hairlines with their names. */
function levels(placed: readonly SpreadPiece[], width: number, letters: number): string {
  const seen = new Map<string, number>();
  for (const { piece, translate } of placed) {
    if (piece.part === 'flare') continue;
    for (const { level, from } of piece.levels) {
      if (!seen.has(levelTitles[level])) {
        seen.set(levelTitles[level], from.y + translate.y + margin);
      }
    }
  }
  return [...seen]
    .map(
      ([name, y]) =>
        `<path stroke="var(--level)" stroke-width="1.6" d="M${margin} ${y.toFixed(1)}H${width}"/>` +
        `<text fill="var(--brass)" font-size="${letters}" text-anchor="end" x="${width - 8}" y="${(y - 7).toFixed(1)}">${name}</text>`,
    )
    .join('');
}

/** Marks every inch along the top and left, every fourth longer. */
function rod(width: number, height: number): string {
  const inch = 25.4;
  const marks = (length: number): number[] =>
    Array.from({ length: Math.floor((length - margin) / inch) + 1 }, (_, count) => count);
  const long = (count: number): number => (count % 4 === 0 ? 24 : 12);
  const place = (count: number): string => (margin + count * inch).toFixed(1);
  return [
    `M${width} 1H1V${height}`,
    ...marks(width).map((count) => `M${place(count)} 1V${long(count)}`),
    ...marks(height).map((count) => `M1 ${place(count)}H${long(count)}`),
  ].join('');
}
