import { Router } from 'express';
import {
  changePassword,
  listSessions,
  signIn,
  signOut,
  signOutEverywhere,
  signUp,
  whoAmI,
} from '#shared/api/accounts.ts';
import type { Received } from '#shared/api/endpoint.ts';
import { addressLimit } from '../../http/address-limit.ts';
import { type Own, serveOwn } from '../../http/serve-own.ts';
import { serveTo } from '../../http/serve.ts';
import type { Caller } from '../../http/session.ts';
import { addressOf } from '../../http/turn-of.ts';
import * as service from './service.ts';

/** Keeps what was drawn before there was an account, as its first gown. */
type KeepGown = (
  caller: Omit<Caller, 'email'>,
  gown: NonNullable<Received<typeof signUp>['gown']>,
) => Promise<{ readonly id: string }>;

export function accountRouter({ database, sessions, limits }: Own, keepGown: KeepGown): Router {
  const router = Router();
  const some = addressLimit(limits.signInsPerMinute);
  for (const { path } of [signUp, signIn, changePassword]) router.use(path, some);

  serveTo(router, sessions.callerOf, whoAmI, (_body, { caller }) =>
    Promise.resolve({ account: caller === undefined ? null : { email: caller.email } }),
  );

  serveTo(router, nobody, signIn, async (body, { request, response }) => {
    const claim = { ...body, address: addressOf(request) };
    const { id, email } = await service.signIn(database, claim);
    await sessions.begin(request, response, id);
    return { account: { email } };
  });

  serveTo(router, nobody, signUp, async ({ gown, ...body }, { request, response }) => {
    const claim = { ...body, address: addressOf(request) };
    const { id, email } = await service.signUp(database, claim);
    const place = await sessions.begin(request, response, id);
    const kept = gown && (await keepGown({ accountId: id, ...place }, gown));
    return { account: { email }, ...(kept && { gownId: kept.id }) };
  });

  serveTo(router, sessions.callerOf, signOut, async (_body, { response, caller }) => {
    if (caller !== undefined) await sessions.end(response, caller);
    return {};
  });

  serveOwn(router, sessions, signOutEverywhere, async (_body, { response, caller }) => {
    await sessions.endAll(response, caller.accountId);
    return {};
  });

  serveOwn(router, sessions, changePassword, async (body, { request, response, caller }) => {
    const claim = { email: caller.email, password: body.password, address: addressOf(request) };
    await service.changePassword(database, claim, body.newPassword);
    await sessions.endAll(response, caller.accountId);
    await sessions.begin(request, response, caller.accountId);
    return {};
  });

  serveOwn(router, sessions, listSessions, async (_body, { caller }) => {
    const places = await sessions.placesOf(caller.accountId);
    return {
      sessions: places
        .toSorted((a, b) => b.lastUsedAt.getTime() - a.lastUsedAt.getTime())
        .map(({ sessionId, device, startedAt, lastUsedAt }) => ({
          device,
          startedAt: startedAt.toISOString(),
          lastUsedAt: lastUsedAt.toISOString(),
          here: sessionId === caller.sessionId,
        })),
    };
  });
  return router;
}

const nobody = () => Promise.resolve(undefined);
