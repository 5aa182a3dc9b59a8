import { addressFromEnvironment } from './address.mjs';
import { buildIfChanged } from './build-if-changed.mjs';
import { startCluster } from './cluster.mjs';
import { ensureDebianPackages, ensureNpmPackages } from './install.mjs';
import { startServer, whoAnswers } from './server-process.mjs';
import { StopError, command } from './shell.mjs';

/**
 * Ctrl-C or a polite kill, from now on answered by closing in good order.
 * @returns {Promise<number>}
 */
function askedToStop() {
  return new Promise((resolve) => {
    for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => resolve(0));
  });
}

await command(async () => {
  const address = addressFromEnvironment();
  const there = await whoAnswers(address.local);
  if (there === 'ellwand') {
    console.log(`Ellwand is open already at ${address.shown}`);
    return 0;
  }
  if (there === 'another') {
    throw new StopError(
      `Another program answers at ${address.local}. Choose another port: PORT=4174 npm start`,
    );
  }
  await ensureNpmPackages();
  await ensureDebianPackages('serve');
  await buildIfChanged();
  const asked = askedToStop();
  const cluster = await startCluster('cluster', { durable: true });
  try {
    const server = await startServer(
      ['--enable-source-maps', 'dist/server/index.js'],
      address.local,
      {
        NODE_ENV: 'production',
        DATABASE_URL: cluster.url,
        HOST: address.host,
        PORT: String(address.port),
      },
    );
    console.log(`\nEllwand is open at ${address.shown}  (Ctrl-C closes it)\n`);
    const code = await Promise.race([server.ended, asked]);
    await server.stop();
    return code;
  } finally {
    if (cluster.started) cluster.stop();
  }
});
