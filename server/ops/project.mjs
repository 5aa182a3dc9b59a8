import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';

/** The project's root folder, wherever a command was called from. */
export const root = dirname(dirname(dirname(fileURLToPath(import.meta.url))));

/** Everything the commands keep between runs; ignored by git. */
export const keep = join(root, '.ellwand');
