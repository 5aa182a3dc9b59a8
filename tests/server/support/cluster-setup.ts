import { Client } from 'pg';
import type { TestProject } from 'vitest/node';
import { connect } from '#server/database/client.ts';
import { migrate } from '#server/database/migrate.ts';
import { seedSamples } from '#server/database/sample-seed.ts';
import { startPassingCluster } from '#server/ops/cluster.mjs';
import { owner } from '#server/ops/database-owner.mjs';
import { places } from '#server/settings.ts';

declare module 'vitest' {
  export interface ProvidedContext {
    clusterUrl: string;
    adminUrl: string;
  }
}

/** Name of the migrated and seeded database that every test file clones. */
export const template = 'ellwand_template';

/** A cluster of its own for the whole run, with one database ready to be cloned. */
export default async function setup(project: TestProject): Promise<() => void> {
  const cluster = await startPassingCluster();
  const admin = new Client({ connectionString: cluster.adminUrl });
  await admin.connect();
  await admin.query(`create database ${template} owner ${owner}`);
  await admin.end();
  const { database, close } = connect(cluster.url.replace(/postgres$/, template), () => undefined);
  await migrate(database, places.migrations);
  await seedSamples(database);
  await close();
  project.provide('clusterUrl', cluster.url);
  project.provide('adminUrl', cluster.adminUrl);
  return () => {
    cluster.stop();
  };
}
