import { randomBytes } from 'node:crypto';
import type { RequestHandler } from 'express';
import { Client } from 'pg';
import { pino } from 'pino';
import { inject } from 'vitest';
import { buildApp } from '#server/app.ts';
import { connect } from '#server/database/client.ts';
import { openDrafter } from '#server/drafting/drafter.ts';
import { openPrinter } from '#server/features/print/printer.ts';
import { ownOrigins } from '#server/http/own-origins.ts';
import { listen } from '#server/listen.ts';
import type { Limits } from '#server/settings.ts';
import { owner } from '#server/ops/database-owner.mjs';
import { freePort } from '#server/ops/free-port.mjs';
import { template } from './cluster-setup.ts';

export type ServerUnderTest = {
  readonly address: string;
  /** Every line the server has logged so far. */
  readonly logged: () => string;
  readonly databaseUrl: string;
  readonly close: () => Promise<void>;
};

const roomy: Limits = {
  requestsPerMinute: 100_000,
  classVisitsPerMinute: 100_000,
  draftsPerMinute: 10_000,
  draftsWaiting: 100,
  draftsFromOneAddress: 100,
  savesPerMinute: 10_000,
  signInsPerMinute: 10_000,
  signUpsPerHour: 10_000,
  printsPerMinute: 10_000,
  printsWaiting: 100,
  printsFromOneAddress: 100,
};

async function asAdmin(sentence: string): Promise<void> {
  const admin = new Client({ connectionString: inject('adminUrl') });
  await admin.connect();
  await admin.query(sentence);
  await admin.end();
}

/** A real server on a real database of its own, cloned from the template, or on one that is there. */
export async function startServer(
  options: {
    readonly limits?: Partial<Limits>;
    readonly screens?: RequestHandler;
    readonly overHttps?: boolean;
    readonly publicUrl?: string;
    readonly databaseUrl?: string;
    readonly trustedProxies?: number;
  } = {},
): Promise<ServerUnderTest> {
  const name = `clone_${randomBytes(6).toString('hex')}`;
  if (options.databaseUrl === undefined)
    await asAdmin(`create database ${name} template ${template} owner ${owner}`);
  const databaseUrl = options.databaseUrl ?? inject('clusterUrl').replace(/postgres$/, name);
  const { database, close } = connect(databaseUrl, () => undefined);
  const lines: string[] = [];
  const limits = { ...roomy, ...options.limits };
  const drafter = openDrafter(limits);
  const printer = openPrinter(limits);
  const port = await freePort();
  const app = buildApp({
    database,
    drafter,
    printer,
    log: pino({ base: null }, { write: (line) => void lines.push(line) }),
    limits,
    overHttps: options.overHttps ?? false,
    origins: ownOrigins({ publicUrl: options.publicUrl, host: '127.0.0.1', port }),
    trustedProxies: options.trustedProxies ?? 0,
    screens: options.screens ?? ((_request, _response, next) => next()),
    strictHeaders: true,
  });
  const stopListening = await listen(app, port, '127.0.0.1');
  return {
    address: `http://127.0.0.1:${port}`,
    logged: () => lines.join(''),
    databaseUrl,
    close: async () => {
      await stopListening();
      await Promise.all([drafter.close(), printer.close()]);
      await close();
      await asAdmin(`drop database if exists ${name} with (force)`);
    },
  };
}
