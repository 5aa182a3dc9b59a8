import { whoAnswers } from './server-process.mjs';
import { StopError } from './shell.mjs';

/**
 * @typedef {object} Address
 * @property {string} host
 * @property {number} port
 * @property {string} local where it is reached from this machine
 * @property {string} shown the address people type
 */

/** Where the server listens, and the address people type, from PORT, HOST and PUBLIC_URL. @returns {Address} */
export function addressFromEnvironment() {
  const host = process.env['HOST'] ?? '127.0.0.1';
  const port = Number(process.env['PORT'] ?? 4173);
  if (!Number.isInteger(port) || port < 1 || port > 65_535) {
    throw new StopError(
      `PORT must be a whole number from 1 to 65535; it is "${process.env['PORT']}".`,
    );
  }
  const everywhere = host === '0.0.0.0' || host === '::';
  const reach = everywhere ? '127.0.0.1' : host.includes(':') ? `[${host}]` : host;
  const local = `http://${reach}:${port}`;
  return { host, port, local, shown: process.env['PUBLIC_URL'] ?? local };
}

/**
 * Whether an Ellwand answers there already, which is told; another program there is a reason to stop.
 * @param {Address} address
 */
export async function isOpenAlready(address) {
  const there = await whoAnswers(address.local);
  if (there === 'another') {
    const another = `PORT=${address.port + 1} npm start`;
    throw new StopError(
      `Another program answers at ${address.local}. Choose another port: ${another}`,
    );
  }
  if (there === 'ellwand') console.log(`Ellwand is open already at ${address.shown}`);
  return there === 'ellwand';
}
