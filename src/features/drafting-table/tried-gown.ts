import type { GownContent } from '#shared/api/gowns.ts';

import { contentOf } from './gown-content.ts';
import { clearKeptTable, keptTable } from './saved-table.ts';

/** What lies on the table at Try it, as a gown to keep; no answer where nothing was typed. */
export function triedGown(): { readonly title: string; readonly content: GownContent } | undefined {
  const table = keptTable('cm');
  if (Object.keys(table.entries).length === 0) return undefined;
  const name = table.name.trim();
  return {
    title: name === '' ? 'First gown' : `Gown for ${name}`,
    content: contentOf(table, table.unit),
  };
}

/** Clears the table at Try it once its gown is kept elsewhere. */
export const clearTriedTable = clearKeptTable;
