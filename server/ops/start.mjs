import { addressFromEnvironment, isOpenAlready } from './address.mjs';
import { buildIfChanged } from './build-if-changed.mjs';
import { ensureDebianPackages, ensureNpmPackages } from './install.mjs';
import { serveUntilStopped } from './serve-until-stopped.mjs';
import { command } from './shell.mjs';

await command(async () => {
  const address = addressFromEnvironment();
  if (await isOpenAlready(address)) return 0;
  await ensureNpmPackages();
  await ensureDebianPackages('serve');
  await buildIfChanged();
  const program = ['--enable-source-maps', 'dist/server/index.js'];
  return serveUntilStopped(program, address, { NODE_ENV: 'production' });
});
