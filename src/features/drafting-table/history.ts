import type { Unit } from '#shared/units/said.ts';

import { isRecord } from './is-record.ts';
import {
  differingParts,
  keptParts,
  partOf,
  samePart,
  withParts,
  type PartKey,
  type Parts,
} from './parts.ts';
import type { Choices } from './table-inputs.ts';

/** What one gesture changed: the parts it touched as they were before and as they are after. */
export type Change = { readonly before: Parts; readonly after: Parts };

/** Changes that can be taken back, the last one last, and those taken back, the next one first. */
export type History = {
  readonly past: readonly Change[];
  readonly future: readonly Change[];
  /** A gesture still going on: what it adds belongs to the change it began. */
  readonly open?: {
    readonly gesture: string;
    readonly from: Choices;
    readonly past: readonly Change[];
  };
};

export const noHistory: History = { past: [], future: [] };

/** No more changes than this are kept; the oldest are forgotten first. */
const most = 100;

/** The history after an edit. What belongs to one gesture is one change; new work ends what could be redone. */
export function recorded(
  history: History,
  before: Choices,
  after: Choices,
  gesture?: string,
): History {
  const going = history.open?.gesture === gesture ? history.open : undefined;
  const { from, past } = going ?? { from: before, past: history.past };
  const keys = differingParts(from, after);
  const open = gesture === undefined ? {} : { open: { gesture, from, past } };
  if (keys.length === 0 && going === undefined) return { ...history, ...open };
  const change = { before: some(from, keys), after: some(after, keys) };
  return { past: keys.length === 0 ? past : [...past, change].slice(-most), future: [], ...open };
}

const some = (choices: Choices, keys: readonly PartKey[]): Parts =>
  Object.fromEntries(keys.map((key) => [key, partOf(choices, key)]));

/** The history with no gesture going on. */
export const closed = ({ past, future }: History): History => ({ past, future });

type Turned = { readonly choices: Choices; readonly history: History };

/** Takes the last change back; no answer where there is none. */
export function undone(choices: Choices, history: History, unit: Unit): Turned | undefined {
  const last = history.past.at(-1);
  if (last === undefined) return undefined;
  return {
    choices: withParts(choices, last.before, unit),
    history: { past: history.past.slice(0, -1), future: [last, ...history.future] },
  };
}

/** Does again what was taken back last; no answer where nothing was. */
export function redone(choices: Choices, history: History, unit: Unit): Turned | undefined {
  const [next, ...future] = history.future;
  if (next === undefined) return undefined;
  return {
    choices: withParts(choices, next.after, unit),
    history: { past: [...history.past, next], future },
  };
}

/** A history as a browser kept it; forgotten where it does not end in what lies on the table. */
export function keptHistory(kept: unknown, choices: Choices, unit: Unit): History {
  if (!isRecord(kept)) return noHistory;
  const changes = (list: unknown): Change[] =>
    (Array.isArray(list) ? list : []).flatMap((each: unknown) =>
      isRecord(each)
        ? [{ before: keptParts(each['before'], unit), after: keptParts(each['after'], unit) }]
        : [],
    );
  const history = { past: changes(kept['past']), future: changes(kept['future']) };
  const fits =
    lies(history.past.at(-1)?.after, choices) && lies(history.future[0]?.before, choices);
  return fits ? history : noHistory;
}

const lies = (parts: Parts | undefined, choices: Choices): boolean =>
  Object.entries(parts ?? {}).every(([key, part]) => samePart(part, partOf(choices, keyOf(key))));

/** The keys of kept parts were taken from the list of part keys. */
function keyOf(key: string): PartKey {
  return key as PartKey;
}
