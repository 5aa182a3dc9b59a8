import { readFileSync } from 'node:fs';
import { parseArgs } from 'node:util';
import { readInputs } from '#shared/api/read-body.ts';
import { type DraftedInputs, type Garment, garments } from '#shared/engine/drafted.ts';
import type { Proof } from '#shared/proof/proof.ts';
import type { PrintOrder } from '#shared/sheets/print-order.ts';
import type { Problem } from '#shared/units/problem.ts';
import type { Unit } from '#shared/units/said.ts';
import { speak } from '#shared/units/speak.ts';
import { readPaper } from './paper-option.ts';

const usage = [
  'Use: npm run --silent draft -- --measures card.json --style style.json',
  `       [--garment ${garments.join('|')}] [--rules rules.json]`,
  '       [--paper A4|A3|Letter|Legal|Tabloid|A1|A0|roll-36in|roll-90cm|WIDTHxHEIGHT] [--unit cm|in] [--worksheet] --out DIR',
  '     npm run --silent draft -- --schema card|style|rules [--garment …]',
];

/** What the command ends with: every proof line holds, drawn but a line fails, or bad input. */
export const ends = { proven: 0, unproven: 1, refused: 2 } as const;

/** A gown that is drawn but not proven is written all the same, and the exit code says so. */
export const endOf = (proof: Proof): number => (proof.holds ? ends.proven : ends.unproven);

/** What a terminal would obey rather than show: a name of a file or a field may hold it. */
const unshown = /[\p{Cc}\p{Zl}\p{Zp}\p{Bidi_Control}]/gu;

/** Bad input on the command line; its message is for stderr and names the field or the option. */
export class RefusedError extends Error {
  constructor(lines: readonly string[]) {
    super(lines.map((line) => line.replace(unshown, '\ufffd')).join('\n'));
    this.name = 'RefusedError';
  }
}

export const refuse = (...lines: string[]): never => {
  throw new RefusedError(lines);
};

export const refuseProblems = (problems: readonly Problem[], unit: Unit): never =>
  refuse(...problems.map((each) => `${each.field}: ${speak(each.said, unit)}`));

export function readOptions(args: readonly string[]) {
  try {
    return parseArgs({
      args: [...args],
      options: {
        measures: { type: 'string' },
        style: { type: 'string' },
        garment: { type: 'string', default: 'gown' },
        rules: { type: 'string' },
        paper: { type: 'string', default: 'A4' },
        unit: { type: 'string', default: 'cm' },
        worksheet: { type: 'boolean', default: false },
        out: { type: 'string' },
        schema: { type: 'string' },
      },
    }).values;
  } catch (error) {
    return refuse(error instanceof Error ? error.message : String(error), ...usage);
  }
}

function readJson(option: string, path: string): unknown {
  let text: string;
  try {
    text = readFileSync(path, 'utf8');
  } catch {
    return refuse(`--${option}: the file ${path} cannot be read.`);
  }
  try {
    return JSON.parse(text);
  } catch {
    return refuse(`--${option}: the file ${path} is not JSON.`);
  }
}

const isGarment = (name: string): name is Garment => garments.some((each) => each === name);

/** The garment named, or a refusal that names all of them. */
export const readGarment = (name: string): Garment =>
  isGarment(name)
    ? name
    : refuse(`--garment must be one of ${garments.join(', ')}; it is “${name}”.`);

const isUnit = (name: string): name is Unit => name === 'cm' || name === 'in';

/** What is to be drawn, and how it is printed and told. */
export type Order = {
  readonly inputs: DraftedInputs;
  readonly paper: PrintOrder['paper'];
  readonly unit: Unit;
  /** Whether every step is written too, with its figure, for a learner's folder. */
  readonly worksheet: boolean;
  readonly out: string;
};

/** Reads the three files and the choices, or refuses by name what cannot be right. */
export function readOrder(options: ReturnType<typeof readOptions>): Order {
  const { measures, style, rules, paper, unit, worksheet, out } = options;
  const garment = readGarment(options.garment);
  if (measures === undefined)
    return refuse('--measures is missing: name the measure card.', ...usage);
  if (style === undefined) return refuse('--style is missing: name the style card.', ...usage);
  if (out === undefined) return refuse('--out is missing: name a folder for the files.', ...usage);
  if (!isUnit(unit)) return refuse(`--unit must be cm or in; it is “${unit}”.`);
  const sheet = readPaper(paper, unit);
  if ('refused' in sheet) return refuse(sheet.refused);
  const reading = readInputs({
    ...(garment === 'gown' ? {} : { garment }),
    card: readJson('measures', measures),
    style: readJson('style', style),
    ...(rules === undefined ? {} : { rules: readJson('rules', rules) }),
  });
  if ('problems' in reading) return refuseProblems(reading.problems, unit);
  return { inputs: reading.inputs, paper: sheet.paper, unit, worksheet, out };
}
