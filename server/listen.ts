import type { Express } from 'express';
import { createServer, type Server } from 'node:http';

/** Longest time a request under way is waited for when the server closes. */
const patience = 8000;

/** Listens, and gives back the way to close in good order. */
export async function listen(
  app: Express,
  port: number,
  host: string,
): Promise<() => Promise<void>> {
  const server = createServer({ requestTimeout: 30_000 }, app);
  await new Promise<void>((resolve, reject) => {
    server.once('error', reject);
    server.listen(port, host, resolve);
  });
  return () => close(server);
}

function close(server: Server): Promise<void> {
  return new Promise((resolve) => {
    const cutOff = setTimeout(() => {
      server.closeAllConnections();
    }, patience);
    server.close(() => {
      clearTimeout(cutOff);
      resolve();
    });
    server.closeIdleConnections();
  });
}
