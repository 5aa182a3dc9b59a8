import { chmodSync, chownSync, existsSync, mkdirSync, readdirSync, writeFileSync } from 'node:fs';
import { createHash } from 'node:crypto';
import { basename, dirname, join } from 'node:path';
import { StopError, isRoot, quietly } from './shell.mjs';

/** Folder of PostgreSQL's own programs, the newest version Debian has. */
function programFolder() {
  const debian = '/usr/lib/postgresql';
  const versions = existsSync(debian) ? readdirSync(debian) : [];
  const newest = versions
    .sort((a, b) => Number(b) - Number(a))
    .find((each) => existsSync(join(debian, each, 'bin', 'initdb')));
  if (newest !== undefined) return join(debian, newest, 'bin');
  const found = quietly('sh', ['-c', 'command -v initdb']);
  if (!found.ok) throw new StopError('PostgreSQL is not installed (initdb was not found).');
  return dirname(found.output);
}

/** PostgreSQL refuses to run as root; Debian's package brings a user for it. */
function databaseUser() {
  for (const name of ['postgres', 'nobody']) {
    const uid = quietly('id', ['-u', name]);
    const gid = quietly('id', ['-g', name]);
    if (uid.ok && gid.ok) return { uid: Number(uid.output), gid: Number(gid.output) };
  }
  throw new StopError('There is no ordinary user to run PostgreSQL as (postgres or nobody).');
}

/**
 * Runs a program as the database's user. Its working folder is `/`, as the project's may be closed
 * to that user.
 * @param {string} program
 * @param {readonly string[]} args
 */
function asDatabaseUser(program, args) {
  if (!isRoot()) return quietly(program, args, { cwd: '/' });
  const { uid, gid } = databaseUser();
  const as = [`--reuid=${uid}`, `--regid=${gid}`, '--clear-groups'];
  return quietly('setpriv', [...as, program, ...args], { cwd: '/' });
}

/**
 * Runs one of PostgreSQL's own programs.
 * @param {string} program
 * @param {readonly string[]} args
 */
export const postgres = (program, args) => asDatabaseUser(join(programFolder(), program), args);

/**
 * Sends sentences to a cluster on loopback; the password goes by the environment, which others cannot read.
 * @param {{ port: number, user: string, password: string }} who
 * @param {string} sentences
 */
export const psql = ({ port, user, password }, sentences) =>
  quietly(
    join(programFolder(), 'psql'),
    [
      ...['-X', '-q', '-v', 'ON_ERROR_STOP=1', '-h', '127.0.0.1', '-p', String(port)],
      ...['-U', user, '-d', 'postgres', '-f', '-'],
    ],
    { cwd: '/', env: { PGPASSWORD: password }, input: sentences },
  );

/** @param {string} path */
function giveToDatabaseUser(path) {
  if (!isRoot()) return;
  const { uid, gid } = databaseUser();
  chownSync(path, uid, gid);
}

/** @param {string} folder */
function ownFolder(folder) {
  mkdirSync(dirname(folder), { recursive: true, mode: 0o755 });
  mkdirSync(folder, { recursive: true, mode: 0o700 });
  giveToDatabaseUser(folder);
  chmodSync(folder, 0o700);
}

/**
 * A file only the database's user (and root) can read.
 * @param {string} path
 * @param {string} text
 */
export function writeForDatabaseUser(path, text) {
  writeFileSync(path, text, { mode: 0o600 });
  giveToDatabaseUser(path);
}

/**
 * A folder for a cluster that its user can reach: the wanted one or, where a parent of it is closed
 * to that user (a clone in root's home), one of its own under /var/lib.
 * @param {string} wanted
 */
export function clusterFolder(wanted) {
  ownFolder(wanted);
  if (asDatabaseUser('test', ['-w', wanted]).ok) return wanted;
  const mark = createHash('sha256').update(wanted).digest('hex').slice(0, 12);
  const elsewhere = join('/var/lib/ellwand', `${basename(wanted)}-${mark}`);
  ownFolder(elsewhere);
  return elsewhere;
}
