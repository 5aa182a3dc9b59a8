import type { RequestHandler } from 'express';
import { pino } from 'pino';
import { buildApp } from './app.ts';
import { connect } from './database/client.ts';
import { settleDemoAccount } from './database/demo-account.ts';
import { migrate } from './database/migrate.ts';
import { seedSamples } from './database/sample-seed.ts';
import { openDrafter } from './drafting/drafter.ts';
import { deleteExpiredClasses } from './features/lessons/repository.ts';
import { openPrinter } from './features/print/printer.ts';
import { isOnThisMachineAlone, ownOrigins } from './http/own-origins.ts';
import { listen } from './listen.ts';
import { places, readSettings } from './settings.ts';

/** Runs a server until it is asked to stop: database brought up to date first, then open. */
export async function runServer(screens: {
  readonly handler: RequestHandler;
  readonly strictHeaders: boolean;
  readonly close?: () => Promise<void>;
}): Promise<void> {
  const settings = readSettings(process.env);
  const log = pino({ level: settings.logLevel, base: null });
  const { database, close } = connect(settings.databaseUrl, (error) => {
    log.warn({ kind: error.name }, 'a database connection was lost');
  });
  await migrate(database, places.migrations);
  await seedSamples(database);
  await deleteExpiredClasses(database, new Date());
  await settleDemoAccount(database, isOnThisMachineAlone(settings));
  const { limits, overHttps, trustedProxies } = settings;
  const drafter = openDrafter(limits);
  drafter.begin();
  const printer = openPrinter(limits);
  const app = buildApp({
    database,
    drafter,
    printer,
    log,
    limits,
    overHttps,
    origins: ownOrigins(settings),
    trustedProxies,
    screens: screens.handler,
    strictHeaders: screens.strictHeaders,
  });
  const stopListening = await listen(app, settings.port, settings.host);
  log.info({ port: settings.port }, 'open');
  const stop = async () => {
    await stopListening();
    await screens.close?.();
    await Promise.all([drafter.close(), printer.close()]);
    await close();
    log.info('closed');
  };
  // Ctrl-C reaches every process of the terminal, and the parent's own word follows it.
  let stopping: Promise<void> | undefined;
  for (const signal of ['SIGINT', 'SIGTERM'] as const) {
    process.on(signal, () => void (stopping ??= stop()));
  }
}
