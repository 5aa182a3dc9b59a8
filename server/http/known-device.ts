import { createHash, randomBytes } from 'node:crypto';
import type { Request, Response } from 'express';

const year = 365 * 24 * 60 * 60 * 1000;

/** How a browser is told again that somebody was signed in on. It opens nothing: it is only not taken for a stranger. */
export type DeviceCookie = {
  /** Digest of what the browser holds, if it holds anything. */
  readonly of: (request: Request) => string | undefined;
  /** Gives the browser its mark, or the one it has once more; its digest. */
  readonly give: (request: Request, response: Response) => string;
};

const digest = (secret: string): string => createHash('sha256').update(secret).digest('hex');

export function deviceCookie(overHttps: boolean): DeviceCookie {
  const name = overHttps ? '__Host-ellwand-device' : 'ellwand-device';
  const secretOf = (request: Request): string | undefined =>
    (request.headers.cookie ?? '')
      .split(/;\s*/)
      .map((pair) => new RegExp(`^${name}=([0-9a-f]{40})$`).exec(pair)?.[1])
      .find((secret) => secret !== undefined);
  return {
    of: (request) => {
      const secret = secretOf(request);
      return secret === undefined ? undefined : digest(secret);
    },
    give: (request, response) => {
      const secret = secretOf(request) ?? randomBytes(20).toString('hex');
      response.cookie(name, secret, {
        ...{ httpOnly: true, secure: overHttps, sameSite: 'lax', path: '/', maxAge: year },
      });
      return digest(secret);
    },
  };
}
