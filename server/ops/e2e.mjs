import { runBrowserTests } from './browser-tests.mjs';
import { ensureDebianPackages, ensureNpmPackages } from './install.mjs';
import { command } from './shell.mjs';

await command(async () => {
  await ensureNpmPackages();
  await ensureDebianPackages('test');
  return runBrowserTests(process.argv.slice(2));
});
