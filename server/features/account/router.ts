import { type Request, type Response, Router } from 'express';
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
import { addressLimit, hour } from '../../http/address-limit.ts';
import { deviceCookie } from '../../http/known-device.ts';
import { mostKept } from '../../http/most-kept.ts';
import { type Own, serveOwn } from '../../http/serve-own.ts';
import { serveTo } from '../../http/serve.ts';
import type { Caller } from '../../http/session.ts';
import { addressOf } from '../../http/turn-of.ts';
import { isKnownDevice, noteDevice } from './device-repository.ts';
import * as service from './service.ts';

/** Keeps what was drawn before there was an account, as its first gown. */
type KeepGown = (
  caller: Omit<Caller, 'email'>,
  gown: NonNullable<Received<typeof signUp>['gown']>,
) => Promise<{ readonly id: string }>;

export function accountRouter(
  { database, sessions, limits, overHttps }: Own,
  keepGown: KeepGown,
): Router {
  const router = Router();
  const some = addressLimit(limits.signInsPerMinute);
  for (const { path } of [signUp, signIn, changePassword]) router.use(path, some);
  router.use(signUp.path, addressLimit(limits.signUpsPerHour, { within: hour, onlyDone: true }));
  const devices = deviceCookie(overHttps);

  /** Who tries, and whether this account was signed in on this browser before. */
  const claimOf = async <C extends { readonly email: string }>(body: C, request: Request) => {
    const device = devices.of(request);
    const isKnown = device !== undefined && (await isKnownDevice(database, body.email, device));
    return { ...body, address: addressOf(request), ...(isKnown && { knownAs: device }) };
  };

  const begin = async (
    request: Request,
    response: Response,
    account: Parameters<typeof sessions.begin>[2],
  ) => {
    const place = await sessions.begin(request, response, account);
    await noteDevice(database, account.id, devices.give(request, response), mostKept.knownDevices);
    return place;
  };

  serveTo(router, sessions.callerOf, whoAmI, (_body, { caller }) =>
    Promise.resolve({ account: caller === undefined ? null : { email: caller.email } }),
  );

  serveTo(router, nobody, signIn, async (body, { request, response }) => {
    const account = await service.signIn(database, await claimOf(body, request));
    await begin(request, response, account);
    return { account: { email: account.email } };
  });

  serveTo(router, nobody, signUp, async ({ gown, ...body }, { request, response }) => {
    const account = await service.signUp(database, await claimOf(body, request));
    const place = await begin(request, response, account);
    const kept = gown && (await keepGown({ accountId: account.id, ...place }, gown));
    return { account: { email: account.email }, ...(kept && { gownId: kept.id }) };
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
    const { email, sessionId: knownAs } = caller;
    const claim = { email, password: body.password, address: addressOf(request), knownAs };
    await begin(request, response, await service.changePassword(database, claim, body.newPassword));
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
