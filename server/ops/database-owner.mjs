import { randomBytes } from 'node:crypto';
import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { psql, writeForDatabaseUser } from './database-user.mjs';
import { StopError } from './shell.mjs';

/** Role the server works as: the database is its own, the cluster is not. */
export const owner = 'ellwand_owner';

/**
 * Makes the owner, and gives it what an older Ellwand made as the cluster's superuser; a second time
 * changes nothing.
 * @param {string} password
 */
const settling = (password) => `
do $$
declare each record;
begin
  if not exists (select from pg_roles where rolname = '${owner}') then
    create role ${owner} nosuperuser nocreatedb nocreaterole noreplication nobypassrls;
  end if;
  alter role ${owner} login password '${password}';
  alter database postgres owner to ${owner};
  for each in
    select nspname from pg_namespace
    where nspowner = current_user::regrole and nspname not in ('public', 'information_schema')
      and nspname not like 'pg\\_%'
  loop
    execute format('alter schema %I owner to ${owner}', each.nspname);
  end loop;
  -- The sequence of a numbered column goes with its table.
  for each in
    select nspname, relname from pg_class join pg_namespace n on n.oid = relnamespace
    where relowner = current_user::regrole and relkind in ('r', 'p', 'v', 'm')
      and nspname <> 'information_schema' and nspname not like 'pg\\_%'
  loop
    execute format('alter table %I.%I owner to ${owner}', each.nspname, each.relname);
  end loop;
end $$;
`;

/**
 * Sees to it that the database has an owner of its own; gives the owner's password.
 * @param {string} folder of the cluster
 * @param {{ port: number, user: string, password: string }} superuser
 */
export function settleOwner(folder, superuser) {
  const passwordFile = join(folder, 'owner-password');
  if (!existsSync(passwordFile)) {
    writeForDatabaseUser(passwordFile, randomBytes(24).toString('hex'));
  }
  const password = readFileSync(passwordFile, 'utf8');
  const done = psql(superuser, settling(password));
  if (!done.ok) throw new StopError(`The database got no owner of its own:\n${done.output}`);
  return password;
}
