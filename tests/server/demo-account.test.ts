import { afterAll, beforeAll, describe, it } from 'vitest';
import { listSessions, signIn } from '#shared/api/accounts.ts';
import { connect, type Connection } from '#server/database/client.ts';
import { demoAccount, settleDemoAccount } from '#server/database/demo-account.ts';
import { openBrowser } from './support/maker.ts';
import { type ServerUnderTest, startServer } from './support/server-under-test.ts';

let server: ServerUnderTest;
let connection: Connection;
beforeAll(async () => {
  server = await startServer();
  connection = connect(server.databaseUrl, () => undefined);
});
afterAll(async () => {
  await connection.close();
  await server.close();
});

describe('the demo account', () => {
  it('is let in on a machine of one’s own, and thrown out where others can come by', async () => {
    const visitor = openBrowser(server.address);
    await visitor.refused(401, signIn, demoAccount);
    await settleDemoAccount(connection.database, false);
    await visitor.refused(401, signIn, demoAccount);
    await settleDemoAccount(connection.database, true);
    await visitor.call(signIn, demoAccount);
    await settleDemoAccount(connection.database, false);
    await visitor.refused(401, listSessions);
    await visitor.refused(401, signIn, demoAccount);
  });
});
