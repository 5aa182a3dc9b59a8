import { z } from 'zod';
import { coreMeasures, furtherMeasures, type MeasureKey } from '../body/card.ts';
import { measureGuide } from '../body/measure-guide.ts';
import { styleLabels } from '../drafts/gown/style-labels.ts';
import { styleKeys } from '../drafts/gown/style-limits.ts';
import { type DraftedInputs, garments } from '../engine/drafted.ts';
import { sheetNames } from '../sheets/print-order.ts';
import { selections } from '../sheets/selection.ts';
import { error, type Problem } from '../units/problem.ts';
import { said, type Said } from '../units/said.ts';
import { cardYears } from './measure-cards.ts';
import { draftRequest } from './requests.ts';

/** No more than this many problems at once: a body of nonsense gets a short answer. */
const most = 40;

const names = new Map<string, string>([
  ...[...coreMeasures, ...furtherMeasures].map(
    (key: MeasureKey) => [`card.${key}`, measureGuide[key].label] as const,
  ),
  ...styleKeys.map((key) => [`style.${key}`, styleLabels[key]] as const),
  ['card', 'The measure card'],
  ['card.date', 'The date of the card'],
  ['takenOn', 'The date of the card'],
  ['style', 'The style card'],
  ['rules', 'The house rules'],
  ['', 'The request'],
  ['email', 'The e-mail address'],
  ['password', 'The password'],
  ['newPassword', 'The new password'],
  ['title', 'The title'],
  ['name', 'The name'],
  ['order', 'The order of the sheets'],
  ['order.paper', 'The paper'],
  ['order.margin', 'The margin'],
  ['order.overlap', 'The overlap'],
  ['order.pieces', 'The choice of pieces'],
  ['order.orientation', 'The way the sheets lie'],
  ['order.glueMarks', 'The choice of glue marks'],
  ['order.lines', 'The choice of lines'],
  ['order.inkSaving', 'The choice to save ink'],
  ['order.scale', 'The scale'],
  ['order.leftOut', 'The list of sheets left out'],
]);

/** A gown's cards lie deeper in some requests than in others. */
const within = /^(gown\.)?(content\.)?(inputs\.)?/;

const called = (field: string): string =>
  names.get(field) ?? names.get(field.replace(within, '')) ?? `“${field}”`;

const quoted = (choices: readonly unknown[]): string =>
  choices.map((each) => (typeof each === 'string' ? `“${each}”` : String(each))).join(', ');

const short = (text: string): string => (text.length > 60 ? `${text.slice(0, 60)}…` : text);

/** What stands at a path of the value as it came, if anything. */
const found = (value: unknown, path: readonly PropertyKey[]): unknown =>
  path.reduce<unknown>(
    (at, key) =>
      typeof at === 'object' && at !== null && Object.hasOwn(at, key)
        ? Reflect.get(at, key)
        : undefined,
    value,
  );

/** What an object of the contract looks like. */
const objects: Readonly<Record<string, string>> = {
  '': '{"card": {"bustGirth": 920}}',
  card: '{"bustGirth": 920}',
  style: '{"kneeLevel": 100}',
  rules: '{"preset": "balanced"}',
  'rules.allowance': '{"seam": 15}',
};

/** What may stand where the contract takes more than one form. */
const unions: Readonly<Record<string, string>> = {
  'order.paper': `one of ${quoted(sheetNames)}, or a sheet of your own such as {"width": 305, "height": 457}`,
  'order.pieces': `one of ${quoted(selections)}, or a list such as [{"piece": "front-middle", "copies": 1, "how": "on fold"}]`,
};

const wrongType = (field: string, expected: string, missing: boolean): Said => {
  const name = called(field);
  if (missing && field === '') {
    return said`The request is missing: give it as JSON with a “card” in it.`;
  }
  if (missing) {
    return field.startsWith('card.')
      ? said`${name} is missing: measure it and give it as “${field}”.`
      : said`${name} is missing: give it as “${field}”.`;
  }
  if (expected === 'object' || expected === 'record') {
    return said`${name} must be an object of keys and values, such as ${objects[field] ?? '{"bust": 10}'}.`;
  }
  if (expected === 'array') return said`${name} must be a list.`;
  if (expected === 'boolean') return said`${name} must be true or false.`;
  if (expected === 'int') return said`${name} must be a whole number.`;
  if (expected !== 'number') return said`${name} must be text in quotes.`;
  const unit = field.endsWith('shoulderSlope') ? 'of degrees' : 'of millimetres';
  return field === 'style.flareFraction' || field === 'rules.sideShare'
    ? said`${name} must be a plain number, without quotes, such as 0.5.`
    : said`${name} must be a plain number ${unit}, without quotes or a unit, such as ${field.startsWith('order.') ? 10 : unit === 'of degrees' ? 20 : 920}.`;
};

function remedy(issue: z.core.$ZodIssue, field: string, value: unknown): Said {
  const name = called(field);
  if (issue.code === 'invalid_type') return wrongType(field, issue.expected, value === undefined);
  if (issue.code === 'too_big' && issue.origin !== 'string') {
    return issue.origin === 'array'
      ? said`${name} has too many entries: keep it to ${Number(issue.maximum)}.`
      : said`${name} must be at most ${Number(issue.maximum)}.`;
  }
  if (issue.code === 'too_big') {
    return said`${name} is too long: keep it to ${Number(issue.maximum)} letters.`;
  }
  if (issue.code === 'too_small') {
    return issue.origin === 'string'
      ? said`${name} is too short: give at least ${counted(Number(issue.minimum))}.`
      : said`${name} must be at least ${Number(issue.minimum)}.`;
  }
  if (issue.code === 'invalid_format' && issue.format === 'email') {
    return said`${name} must be a whole address, such as name@example.org.`;
  }
  if (issue.code === 'invalid_format' && issue.format === 'uuid') {
    return said`${name} must be a UUID, such as crypto.randomUUID() gives.`;
  }
  if (issue.code === 'invalid_format' && issue.format === 'date') {
    return said`${name} must be a day written as year, month, day, such as 2026-11-14.`;
  }
  if (issue.code === 'custom' && issue.params?.['outside'] === 'card-years') {
    return said`${name} must be between the years ${String(cardYears.first)} and ${String(cardYears.last)}: look at the year again.`;
  }
  if (issue.code === 'invalid_union' && unions[field] !== undefined) {
    return said`${name} must be ${unions[field]}.`;
  }
  if (issue.code === 'invalid_union' && field.endsWith('garment')) {
    const choices = garments.map((each) => `“${each}”`).join(', ');
    return said`The garment must be one of ${choices}; left out, it is a gown.`;
  }
  if (issue.code === 'invalid_value') {
    const choices = quoted(issue.values);
    return said`${name} must be one of ${choices}.`;
  }
  return said`${name} cannot be read: look up its form in the README.`;
}

const counted = (letters: number): string => (letters === 1 ? '1 letter' : `${letters} letters`);

const fieldOf = (path: readonly PropertyKey[]): string => short(path.map(String).join('.'));

function problemsOf(issue: z.core.$ZodIssue, value: unknown): readonly Problem[] {
  if (issue.code === 'unrecognized_keys') {
    return issue.keys.slice(0, most).map((key) => {
      const field = fieldOf([...issue.path, key]);
      return error({
        code: 'unknown-field',
        field,
        said: said`There is no field “${field}”: take it out, or look up its name in the README.`,
      });
    });
  }
  const field = fieldOf(issue.path);
  const at = found(value, issue.path);
  const code = at === undefined ? 'missing' : 'wrong-form';
  return [error({ code, field, said: remedy(issue, field, at) })];
}

/** A body read against its schema: the value, or what is wrong with its shape, field by field. */
export type Reading<T> = { readonly value: T } | { readonly problems: readonly Problem[] };

/** Reads unknown JSON against a schema of the contract, in our own words where it does not fit. */
export function readBody<S extends z.ZodType>(schema: S, value: unknown): Reading<z.output<S>> {
  const parsed = schema.safeParse(value);
  if (parsed.success) return { value: parsed.data };
  return {
    problems: parsed.error.issues.flatMap((issue) => problemsOf(issue, value)).slice(0, most),
  };
}

/**
 * Turns unknown JSON (`{ card, style?, rules? }`) into the inputs of a draft, or into problems of shape. Server,
 * command line and browser read alike; bounds are checked by the engine.
 */
export function readInputs(
  value: unknown,
): { readonly inputs: DraftedInputs } | { readonly problems: readonly Problem[] } {
  const reading = readBody(draftRequest, value);
  return 'value' in reading ? { inputs: reading.value } : reading;
}
