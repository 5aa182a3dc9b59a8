import { type InputFile, inputFiles, jsonSchema } from '#shared/api/json-schema.ts';
import { DraftingError } from '#shared/drafting/drafting-error.ts';
import { type Drafted, draftAny } from '#shared/engine/drafted.ts';
import { draftJson, proofJson } from '#shared/exports/json.ts';
import { piecesSvg } from '#shared/exports/svg.ts';
import { plainOrder } from '#shared/sheets/print-order.ts';
import { SheetLimitError } from '#shared/sheets/sheet-limit.ts';
import { speak } from '#shared/units/speak.ts';
import { tilesPdf } from '../features/print/tiles-pdf.ts';
import { worksheetPdf } from '../features/print/worksheet-pdf.ts';
import {
  type Order,
  RefusedError,
  endOf,
  ends,
  readGarment,
  readOptions,
  readOrder,
  refuse,
  refuseProblems,
} from './command-order.ts';
import { writeFiles } from './write-files.ts';

async function draw({
  inputs,
  paper,
  unit,
}: Order): Promise<{ draft: Drafted; tiles: Uint8Array }> {
  try {
    const draft = draftAny(inputs);
    return { draft, tiles: await tilesPdf(draft, { ...plainOrder, paper }, unit) };
  } catch (error) {
    if (error instanceof DraftingError) return refuseProblems(error.problems, unit);
    if (error instanceof SheetLimitError) return refuseProblems([error.problem], unit);
    throw error;
  }
}

function write(folder: string, files: Readonly<Record<string, string | Uint8Array>>): void {
  try {
    writeFiles(folder, files);
  } catch {
    refuse(`--out: the folder ${folder} cannot be written to.`);
  }
}

const isInputFile = (name: string): name is InputFile => inputFiles.some((each) => each === name);

function tellSchema(name: string, garment: string): void {
  if (!isInputFile(name)) return refuse(`--schema must be card, style or rules; it is “${name}”.`);
  console.log(JSON.stringify(jsonSchema(name, readGarment(garment)), undefined, 2));
}

/** A worksheet is for a folder: on Letter where that is printed on, else on A4. */
const worksheetOn = ({ paper, unit }: Order, draft: Drafted): Promise<Uint8Array> =>
  worksheetPdf(draft, { paper: paper === 'Letter' ? 'Letter' : 'A4', unit });

async function main(args: readonly string[]): Promise<number> {
  const options = readOptions(args);
  if (options.schema !== undefined) {
    tellSchema(options.schema, options.garment);
    return ends.proven;
  }
  const order = readOrder(options);
  const { draft, tiles } = await draw(order);
  write(order.out, {
    'pieces.svg': piecesSvg(draft, order.unit),
    'draft.json': draftJson(draft),
    'proof.json': proofJson(draft),
    'tiles.pdf': tiles,
    ...(order.worksheet ? { 'worksheet.pdf': await worksheetOn(order, draft) } : {}),
  });
  for (const each of draft.warnings) {
    console.error(`${each.field}: ${speak(each.said, order.unit)}`);
  }
  console.log(speak(draft.proof.verdict, order.unit));
  return endOf(draft.proof);
}

try {
  process.exitCode = await main(process.argv.slice(2));
} catch (error) {
  if (!(error instanceof RefusedError)) throw error;
  console.error(error.message);
  process.exitCode = ends.refused;
}
