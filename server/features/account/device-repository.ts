import { and, desc, eq, notInArray } from 'drizzle-orm';
import type { Database } from '../../database/client.ts';
import { accounts } from '../../database/schema/accounts.ts';
import { knownDevices } from '../../database/schema/known-devices.ts';

/** Whether somebody was signed in to the account of an e-mail on a browser before. */
export async function isKnownDevice(
  database: Database,
  email: string,
  device: string,
): Promise<boolean> {
  const rows = await database
    .select({ device: knownDevices.device })
    .from(knownDevices)
    .innerJoin(accounts, eq(accounts.id, knownDevices.accountId))
    .where(and(eq(accounts.email, email), eq(knownDevices.device, device)));
  return rows.length > 0;
}

/** Keeps that an account was signed in on a browser, and the latest so many of them. */
export async function noteDevice(
  database: Database,
  accountId: string,
  device: string,
  most: number,
): Promise<void> {
  const usedAt = new Date();
  await database
    .insert(knownDevices)
    .values({ accountId, device, usedAt })
    .onConflictDoUpdate({
      target: [knownDevices.accountId, knownDevices.device],
      set: { usedAt },
    });
  const latest = database
    .select({ device: knownDevices.device })
    .from(knownDevices)
    .where(eq(knownDevices.accountId, accountId))
    .orderBy(desc(knownDevices.usedAt))
    .limit(most);
  await database
    .delete(knownDevices)
    .where(and(eq(knownDevices.accountId, accountId), notInArray(knownDevices.device, latest)));
}
