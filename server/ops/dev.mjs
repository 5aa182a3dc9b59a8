import { addressFromEnvironment, isOpenAlready } from './address.mjs';
import { ensureDebianPackages, ensureNpmPackages } from './install.mjs';
import { serveUntilStopped } from './serve-until-stopped.mjs';
import { command } from './shell.mjs';

/** One process serves the API and, through Vite as its middleware, the screens as they are edited. */
await command(async () => {
  const address = addressFromEnvironment();
  if (await isOpenAlready(address)) return 0;
  await ensureNpmPackages();
  await ensureDebianPackages('serve');
  return serveUntilStopped(['--import', 'tsx', 'server/dev.ts'], address);
});
