import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';

/** What the surroundings decide about a running server. */
export type Settings = {
  readonly databaseUrl: string;
  readonly host: string;
  readonly port: number;
  /** Address people open, where it is another than host and port say. */
  readonly publicUrl: string | undefined;
  /** Whether people reach it over https, so that browsers are told to stay there. */
  readonly overHttps: boolean;
  /** How many proxies stand before it and are believed about addresses. */
  readonly trustedProxies: number;
  readonly logLevel: string;
  readonly limits: Limits;
};

/** How much one address, and all together, may ask for. */
export type Limits = {
  /** Requests of any kind. */
  readonly requestsPerMinute: number;
  /** Requests of those who follow a class: forty behind one address ask every other second. */
  readonly classVisitsPerMinute: number;
  readonly draftsPerMinute: number;
  /** Drafts that may wait for their turn, those of saves among them; further ones come again in a moment. */
  readonly draftsWaiting: number;
  /** How many of them one address, or for saves one account, may have in the line. */
  readonly draftsFromOneAddress: number;
  /** Requests for gowns and measure cards of one's own; a save drafts as well. */
  readonly savesPerMinute: number;
  /** Sign-ins and sign-ups, whether they succeed or not. */
  readonly signInsPerMinute: number;
  /** Accounts opened; a class may sit behind one address. */
  readonly signUpsPerHour: number;
  readonly printsPerMinute: number;
  /** Prints that may wait for their turn; further ones are sent away for a moment. */
  readonly printsWaiting: number;
  readonly printsFromOneAddress: number;
};

function wholeNumber(env: NodeJS.ProcessEnv, name: string, otherwise: number): number {
  const text = env[name];
  if (text === undefined || text === '') return otherwise;
  const value = Number(text);
  if (!Number.isInteger(value) || value < 0) {
    throw new Error(`${name} must be a whole number, 0 or more; it is "${text}".`);
  }
  return value;
}

function publicAddress(env: NodeJS.ProcessEnv): string | undefined {
  const text = env['PUBLIC_URL'];
  if (text === undefined || text === '') return undefined;
  if (URL.canParse(text) && /^https?:/.test(text)) return text;
  throw new Error(`PUBLIC_URL must be an address such as https://gowns.example; it is "${text}".`);
}

/** Reads the settings from the environment; throws a plain sentence where one cannot be right. */
export function readSettings(env: NodeJS.ProcessEnv): Settings {
  const databaseUrl = env['DATABASE_URL'];
  if (databaseUrl === undefined || databaseUrl === '') {
    throw new Error('DATABASE_URL must name a PostgreSQL database; npm start sets it by itself.');
  }
  const publicUrl = publicAddress(env);
  return {
    databaseUrl,
    host: env['HOST'] ?? '127.0.0.1',
    port: wholeNumber(env, 'PORT', 4173),
    publicUrl,
    overHttps: publicUrl?.startsWith('https:') ?? false,
    trustedProxies: wholeNumber(env, 'TRUST_PROXY', 0),
    logLevel: env['LOG_LEVEL'] ?? 'info',
    limits: {
      requestsPerMinute: wholeNumber(env, 'REQUESTS_PER_MINUTE', 1200),
      classVisitsPerMinute: wholeNumber(env, 'CLASS_VISITS_PER_MINUTE', 2400),
      draftsPerMinute: wholeNumber(env, 'DRAFTS_PER_MINUTE', 240),
      draftsWaiting: wholeNumber(env, 'DRAFTS_WAITING', 48),
      draftsFromOneAddress: wholeNumber(env, 'DRAFTS_FROM_ONE_ADDRESS', 6),
      savesPerMinute: wholeNumber(env, 'SAVES_PER_MINUTE', 300),
      signInsPerMinute: wholeNumber(env, 'SIGN_INS_PER_MINUTE', 60),
      signUpsPerHour: wholeNumber(env, 'SIGN_UPS_PER_HOUR', 60),
      printsPerMinute: wholeNumber(env, 'PRINTS_PER_MINUTE', 30),
      printsWaiting: wholeNumber(env, 'PRINTS_WAITING', 24),
      printsFromOneAddress: wholeNumber(env, 'PRINTS_FROM_ONE_ADDRESS', 8),
    },
  };
}

/** Folder of this file: `server/` as written, `dist/server/` when bundled. */
const here = dirname(fileURLToPath(import.meta.url));
const isBundled = here.endsWith(join('dist', 'server'));

/** Where the files lie that the server reads beside its code. */
export const places = {
  migrations: isBundled ? join(here, 'migrations') : join(here, 'database', 'migrations'),
  client: isBundled ? join(here, '..', 'client') : join(here, '..', 'dist', 'client'),
};

/** A thread's program: bundled beside this file, or as written in its folder. */
const workerPath = (name: string, ...folder: readonly string[]): string =>
  isBundled ? join(here, `${name}.js`) : join(here, ...folder, `${name}-unbuilt.mjs`);

export const workerPaths = {
  draft: workerPath('draft-worker', 'drafting'),
  print: workerPath('print-worker', 'features', 'print'),
};
