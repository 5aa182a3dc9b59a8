import { StopError } from './shell.mjs';

/** Where the server listens, and the address people type, from PORT, HOST and PUBLIC_URL. */
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
