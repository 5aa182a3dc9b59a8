import { startCluster } from './cluster.mjs';
import { startServer } from './server-process.mjs';

/** How often it is looked whether npm still lives. */
const watch = 300;

/**
 * Ctrl-C, a polite kill or, as npm does not hand a kill on, the end of npm itself; from now on
 * answered by closing in good order.
 * @returns {Promise<number>} the exit code
 */
function askedToStop() {
  const parent = process.ppid;
  return new Promise((resolve) => {
    for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => resolve(0));
    if (process.env['npm_lifecycle_event'] === undefined) return;
    const timer = setInterval(() => {
      if (process.ppid === parent) return;
      clearInterval(timer);
      resolve(0);
    }, watch);
    timer.unref();
  });
}

/**
 * Starts the private database and a server on it, and stops in the end what it started.
 * @param {readonly string[]} program arguments for node
 * @param {import('./address.mjs').Address} address
 * @param {Record<string, string>} [env]
 */
export async function serveUntilStopped(program, address, env = {}) {
  const asked = askedToStop();
  const cluster = await startCluster('cluster', { durable: true });
  try {
    const server = await startServer(program, address.local, {
      ...env,
      DATABASE_URL: cluster.url,
      HOST: address.host,
      PORT: String(address.port),
    });
    console.log(`\nEllwand is open at ${address.shown}  (Ctrl-C closes it)\n`);
    const code = await Promise.race([server.ended, asked]);
    await server.stop();
    return code;
  } finally {
    if (cluster.started) cluster.stop();
  }
}
