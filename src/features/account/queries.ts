import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';

import {
  changePassword,
  listSessions,
  signIn,
  signOut,
  signOutEverywhere,
  signUp,
  whoAmI,
} from '#shared/api/accounts.ts';
import type { Sent } from '#shared/api/endpoint.ts';

import { call } from '../../lib/call.ts';
import { hintSignedIn } from '../../lib/signed-in-hint.ts';

/** Who is signed in; nobody is an answer too. */
export const accountQuery = queryOptions({
  queryKey: ['account'],
  queryFn: async ({ signal }) => {
    const { account } = await call(whoAmI, undefined, signal);
    hintSignedIn(account !== null);
    return account;
  },
});

export const sessionsQuery = queryOptions({
  queryKey: ['account', 'sessions'],
  queryFn: async ({ signal }) => (await call(listSessions, undefined, signal)).sessions,
  staleTime: 0,
});

/** What lay on the table before there was an account. */
export type FirstGown = NonNullable<Sent<typeof signUp>['gown']>;

export function useSignIn() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: Sent<typeof signIn>) => call(signIn, body),
    onSuccess: ({ account }) => {
      client.setQueryData(accountQuery.queryKey, account);
      hintSignedIn(true);
    },
  });
}

export function useSignUp() {
  return useMutation({
    mutationFn: (body: Sent<typeof signUp>) => call(signUp, body),
    onSuccess: () => hintSignedIn(true),
  });
}

/** Leaves this session, or all of them; what this browser knew of the account is forgotten. */
export function useLeave(everywhere: boolean) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: () => call(everywhere ? signOutEverywhere : signOut, undefined),
    onSuccess: () => {
      hintSignedIn(false);
      client.clear();
    },
  });
}

export function useChangePassword() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: Sent<typeof changePassword>) => call(changePassword, body),
    onSuccess: () => client.invalidateQueries({ queryKey: sessionsQuery.queryKey }),
  });
}
