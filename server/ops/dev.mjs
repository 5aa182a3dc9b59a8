import { addressFromEnvironment } from './address.mjs';
import { startCluster } from './cluster.mjs';
import { ensureDebianPackages, ensureNpmPackages } from './install.mjs';
import { command, run } from './shell.mjs';

/** One process serves the API and, through Vite as its middleware, the screens as they are edited. */
await command(async () => {
  const address = addressFromEnvironment();
  await ensureNpmPackages();
  await ensureDebianPackages('serve');
  const cluster = await startCluster('cluster', { durable: true });
  for (const signal of ['SIGINT', 'SIGTERM']) process.on(signal, () => undefined);
  try {
    return await run(process.execPath, ['--import', 'tsx', 'server/dev.ts'], {
      env: { DATABASE_URL: cluster.url, HOST: address.host, PORT: String(address.port) },
    });
  } finally {
    if (cluster.started) cluster.stop();
  }
});
