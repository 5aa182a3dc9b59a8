import { mkdirSync } from 'node:fs';
import { basename, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { build } from 'esbuild';

const outputs = fileURLToPath(new URL('../../node_modules/.cache/ellwand/', import.meta.url));

/**
 * Bundles a TypeScript file as the server is bundled, packages left outside, so that what is timed or
 * weighed is the code that ships; gives the path of the bundle.
 */
export async function bundle(entry: URL): Promise<string> {
  mkdirSync(outputs, { recursive: true });
  const outfile = join(outputs, `${basename(entry.pathname, '.ts')}.mjs`);
  await build({
    entryPoints: [fileURLToPath(entry)],
    outfile,
    bundle: true,
    packages: 'external',
    platform: 'node',
    format: 'esm',
    target: 'node20',
    logLevel: 'error',
  });
  return outfile;
}
