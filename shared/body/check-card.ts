import { readingGrace } from '../units/format-length.ts';
import { deg, mm, said, type SaidAngle, type SaidLength } from '../units/said.ts';
import { error, warning, type Problem } from '../units/problem.ts';
import { agreements, type Agreement } from './agreements.ts';
import { coreMeasures, furtherMeasures } from './card.ts';
import type { Body, CoreMeasure, MeasureCard, MeasureKey } from './card.ts';
import { completeCard } from './complete-card.ts';
import { girthWarnings } from './girth-warnings.ts';
import { measureGuide } from './measure-guide.ts';
import { shapeProblems } from './shape-agreements.ts';

/** A quantity of a measure for a sentence: degrees for the shoulder slope, millimetres else. */
const quantity = (key: MeasureKey, value: number): SaidLength | SaidAngle =>
  measureGuide[key].kind === 'angle' ? deg(value) : mm(value);

/**
 * What is wrong with one measure by itself: no number, or outside its bounds. Nothing where it was not taken.
 * The measure card calls it as each value is typed.
 */
export function checkMeasure(key: MeasureKey, value: number | undefined): readonly Problem[] {
  const { label, min, max } = measureGuide[key];
  const field = `card.${key}`;
  if (value === undefined) return [];
  if (!Number.isFinite(value)) {
    return [
      error({
        code: 'not-a-number',
        field,
        said: said`${label} is not a number: measure it and type it again.`,
      }),
    ];
  }
  if (value >= min - readingGrace && value <= max + readingGrace) return [];
  return [
    error({
      code: 'out-of-range',
      field,
      said: said`${label} ${quantity(key, value)} must lie between ${quantity(key, min)} and ${quantity(key, max)}: measure it again, and look whether it was typed in the right unit.`,
    }),
  ];
}

const checkCore = (key: CoreMeasure, value: number | undefined): readonly Problem[] =>
  value === undefined
    ? [
        error({
          code: 'missing',
          field: `card.${key}`,
          said: said`${measureGuide[key].label} is missing: every gown needs it. ${measureGuide[key].how}`,
        }),
      ]
    : checkMeasure(key, value);

/** A card as far as it has been filled in. */
export type CardInProgress = { readonly [K in MeasureKey]?: number | undefined };

/** Every core measure is there: `checkCore` has looked. */
const fullCard = (taken: CardInProgress): MeasureCard => taken as MeasureCard;

/** The measure as the sentence names it, an estimate marked as one. */
const named = (body: Body, key: MeasureKey): string =>
  measureGuide[key].label.toLowerCase() + (key in body.estimated ? ' (estimated)' : '');

const capital = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1);

function checkAgreement(body: Body, agreement: Agreement): readonly Problem[] {
  const { larger, smaller, half, possible, usual } = agreement;
  const whole = body.measures[larger];
  const less = body.measures[smaller];
  const apart = (half === true ? whole / 2 : whole) - less;
  const [least, most] = possible;
  const first = (half === true ? 'half of ' : '') + named(body, larger);
  const guessed = [larger, smaller].some((key) => key in body.estimated);
  const [field, other] = smaller in body.estimated ? [larger, smaller] : [smaller, larger];
  const parts = { field: `card.${field}`, with: [`card.${other}`] };
  const both = said`${capital(named(body, smaller))} ${mm(less)} and ${named(body, larger)} ${mm(whole)}`;
  if (apart < least || apart > most) {
    const bound = apart < least ? least : most;
    const rule =
      bound < 0
        ? said`${named(body, smaller)} may be at most ${mm(-bound)} more than ${first}`
        : said`${first} must be ${apart < least ? 'at least' : 'at most'} ${mm(bound)} more than ${named(body, smaller)}`;
    const remedy = guessed
      ? 'Measure the estimated one too, and take the other again.'
      : 'Measure both again.';
    return [
      error({
        code: 'disagree',
        ...parts,
        said: said`${both} do not go together: ${rule}. ${remedy}`,
      }),
    ];
  }
  if (guessed || usual === undefined || (apart >= usual[0] && apart <= usual[1])) return [];
  return [
    warning({
      code: 'unusual',
      ...parts,
      said: said`${both} are seldom ${apart < usual[0] ? 'so near each other' : 'so far apart'} on one body. Take both again; keep them if they are right.`,
    }),
  ];
}

/** Keeps the first problem of each pair of measures: a warning is said once, and never beside an error. */
const oncePerPair = (problems: readonly Problem[]): readonly Problem[] => {
  const seen = new Set<string>();
  return problems.filter(({ field, with: others }) => {
    const pair = [field, ...(others ?? [])].sort().join();
    return seen.size < seen.add(pair).size;
  });
};

/**
 * What is wrong (errors) or unlikely (warnings) on a measure card, in the order of the card. Agreements are looked at
 * only when every measure lies within its own bounds; a card without errors can be completed and has levels in order.
 */
export function checkCard(taken: CardInProgress): readonly Problem[] {
  const alone = [
    ...coreMeasures.flatMap((key) => checkCore(key, taken[key])),
    ...furtherMeasures.flatMap((key) => checkMeasure(key, taken[key])),
  ];
  if (alone.length > 0) return alone;
  const card = fullCard(taken);
  const found = together(card);
  if (!found.some(isError)) return found;
  const wrongWayRound = exchanged(card);
  return wrongWayRound === undefined ? blamed(found, card) : [wrongWayRound];
}

/** What is wrong or unlikely between the measures of a card that are right by themselves, errors first. */
function together(card: MeasureCard): readonly Problem[] {
  const body = completeCard(card);
  return oncePerPair([
    ...agreements.flatMap((agreement) => checkAgreement(body, agreement)),
    ...shapeProblems(body),
    ...girthWarnings(card),
  ]).toSorted((a, b) => Number(isError(b)) - Number(isError(a)));
}

const isError = ({ severity }: Problem): boolean => severity === 'error';

/** Two measures typed in each other's fields: exchanged, nothing on the card is even unusual. */
function exchanged(card: MeasureCard): Problem | undefined {
  for (const { larger, smaller, half } of agreements) {
    const [more, less] = [card[larger], card[smaller]];
    if (half === true || more === undefined || less === undefined || more >= less) continue;
    const other = { ...card, [larger]: less, [smaller]: more };
    if ([larger, smaller].some((key) => checkMeasure(key, other[key]).length > 0)) continue;
    if (together(other).length > 0) continue;
    return error({
      code: 'disagree',
      field: `card.${smaller}`,
      with: [`card.${larger}`],
      said: said`${measureGuide[smaller].label} ${mm(less)} is more than ${measureGuide[larger].label.toLowerCase()} ${mm(more)}: are the two the wrong way round? If not, measure both again.`,
    });
  }
  return undefined;
}

/** The message stands by the measure that most of the disagreements have in common: it is the likely slip. */
function blamed(problems: readonly Problem[], card: MeasureCard): readonly Problem[] {
  const fieldsOf = ({ field, with: others }: Problem): readonly string[] => [
    field,
    ...(others ?? []),
  ];
  const named = problems.filter(isError).flatMap(fieldsOf);
  const times = (field: string): number => named.filter((each) => each === field).length;
  const wasTaken = new Set(Object.keys(card).map((key) => `card.${key}`));
  return problems.map((problem) => {
    if (!isError(problem)) return problem;
    const fields = fieldsOf(problem);
    const likeliest = fields
      .filter((field) => wasTaken.has(field))
      .reduce((best, field) => (times(field) > times(best) ? field : best), problem.field);
    if (likeliest === problem.field) return problem;
    return { ...problem, field: likeliest, with: fields.filter((field) => field !== likeliest) };
  });
}
