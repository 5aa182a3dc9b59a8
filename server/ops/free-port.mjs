import { createServer } from 'node:net';

/**
 * A port nobody listens on at this moment.
 * @param {string} [host]
 * @returns {Promise<number>}
 */
export function freePort(host = '127.0.0.1') {
  return new Promise((resolve, reject) => {
    const server = createServer();
    server.on('error', reject);
    server.listen(0, host, () => {
      const address = server.address();
      const port = address !== null && typeof address === 'object' ? address.port : 0;
      server.close(() => resolve(port));
    });
  });
}
