import { z } from 'zod';

import {
  drawnHow,
  lineChoices,
  orientations,
  printScales,
  sheetNames,
} from '#shared/sheets/print-order.ts';
import type { Unit } from '#shared/units/said.ts';

import { browserStorage } from '../../lib/browser-storage.ts';
import { printsOnLetter, rememberedUnit } from '../../lib/reader.ts';
import {
  inUnit,
  paperFields,
  plainChoices,
  type PaperField,
  type RoomChoices,
} from './room-choices.ts';
import { readLength, writtenLength, type TypedLength } from './typed-length.ts';

/** What a maker's printer and habits ask for, whatever is printed; kept for good. */
const habits = z.object({
  version: z.literal(1),
  unit: z.enum(['cm', 'in']),
  paper: z.enum([...sheetNames, 'custom']),
  orientation: z.enum(orientations),
  glueMarks: z.boolean(),
  inkSaving: z.boolean(),
  typed: z.object(
    fromFields(() => z.object({ text: z.string().max(24), mm: z.number().optional() })),
  ),
});

/** What was chosen for one draft, kept while the tab is open: a scale for teaching is not for the next gown. */
const forDraft = z.object({
  version: z.literal(1),
  lines: z.enum(lineChoices),
  scale: z.literal(printScales),
  pieces: z.record(
    z.string(),
    z.object({ printed: z.boolean(), copies: z.int().min(1).max(6), how: z.enum(drawnHow) }),
  ),
  leftOut: z.object({ plan: z.string(), names: z.array(z.string()) }),
});

const habitsKey = (maker: string): string => `ellwand.print-room.${maker}`;
const draftKey = (place: string): string => `ellwand.print-room.draft.${place}`;

type Keeping = {
  /** Whose habits: an account, or whoever tries. */
  readonly maker: string;
  /** Which draft. */
  readonly place: string;
};

/** What this browser kept of a maker's choices; else the plain ones. Read in the unit last chosen, else the table's. */
export function keptChoices({ maker, place }: Keeping, unit: Unit): RoomChoices {
  const kept = read('local', habitsKey(maker), habits);
  const own = read('session', draftKey(place), forDraft);
  const plain = plainChoices(
    rememberedUnit() ?? kept?.unit ?? unit,
    printsOnLetter() ? 'Letter' : 'A4',
  );
  const settled =
    kept === undefined
      ? plain
      : {
          ...plain,
          paper: kept.paper,
          orientation: kept.orientation,
          glueMarks: kept.glueMarks,
          inkSaving: kept.inkSaving,
          lengths: inUnit(
            {
              ...plain.lengths,
              ...fromFields((field) => lengthOf(kept.typed[field], kept.unit)),
            },
            plain.unit,
          ),
        };
  if (own === undefined) return settled;
  const { lines, scale, pieces, leftOut } = own;
  return { ...settled, lines, scale, pieces, leftOut };
}

/** Keeps the choices; a browser that keeps nothing asks again the next time. */
export function keepChoices({ maker, place }: Keeping, room: RoomChoices): void {
  const { unit, paper, orientation, glueMarks, inkSaving, lengths } = room;
  const { lines, scale, pieces, leftOut } = room;
  const typed = fromFields((field) => {
    const { text, read } = lengths[field];
    return 'mm' in read ? { text, mm: read.mm } : { text };
  });
  write('local', habitsKey(maker), {
    ...{ version: 1, unit, paper, orientation, glueMarks, inkSaving, typed },
  } satisfies z.input<typeof habits>);
  write('session', draftKey(place), {
    ...{ version: 1, lines, scale, pieces, leftOut },
  });
}

/** A kept length is trusted as a number and written anew; text that was never read is read again. */
const lengthOf = (
  { text, mm }: { readonly text: string; readonly mm?: number | undefined },
  unit: Unit,
): TypedLength => (mm === undefined ? readLength(text, unit) : writtenLength(mm, unit));

function fromFields<T>(value: (field: PaperField) => T): { readonly [F in PaperField]: T } {
  const [margin, overlap, width, height] = paperFields;
  return {
    margin: value(margin),
    overlap: value(overlap),
    width: value(width),
    height: value(height),
  };
}

function read<S extends z.ZodType>(
  kind: 'local' | 'session',
  key: string,
  schema: S,
): z.output<S> | undefined {
  try {
    const text = browserStorage(kind)?.getItem(key) ?? 'null';
    return schema.safeParse(JSON.parse(text)).data;
  } catch {
    return undefined;
  }
}

function write(kind: 'local' | 'session', key: string, value: unknown): void {
  try {
    browserStorage(kind)?.setItem(key, JSON.stringify(value));
  } catch {
    // Without room for them the choices hold for this page alone.
  }
}
