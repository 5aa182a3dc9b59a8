import { buildIfChanged } from './build-if-changed.mjs';
import { startPassingCluster } from './cluster.mjs';
import { freePort } from './free-port.mjs';
import { startServer } from './server-process.mjs';
import { run } from './shell.mjs';

/** Journeys of many browsers come from one address; the limits have tests of their own. */
const roomForManyBrowsers = {
  PRINTS_PER_MINUTE: '1000',
  DRAFTS_PER_MINUTE: '1000',
  SAVES_PER_MINUTE: '10000',
  SIGN_INS_PER_MINUTE: '1000',
  SIGN_UPS_PER_HOUR: '10000',
  REQUESTS_PER_MINUTE: '100000',
};

/**
 * Runs browser journeys against the production build, on a cluster and a port of their own.
 * @param {readonly string[]} files journeys to run; none means all
 * @param {Record<string, string>} [env]
 */
export async function runBrowserTests(files, env = {}) {
  await buildIfChanged();
  const cluster = await startPassingCluster();
  try {
    const port = await freePort();
    const address = `http://127.0.0.1:${port}`;
    const server = await startServer(['--enable-source-maps', 'dist/server/index.js'], address, {
      ...roomForManyBrowsers,
      NODE_ENV: 'production',
      LOG_LEVEL: 'warn',
      DATABASE_URL: cluster.url,
      HOST: '127.0.0.1',
      PORT: String(port),
      PUBLIC_URL: address,
    });
    try {
      return await run('npx', ['playwright', 'test', ...files], {
        env: { ...env, BASE_URL: address },
      });
    } finally {
      await server.stop();
    }
  } finally {
    cluster.stop();
  }
}
