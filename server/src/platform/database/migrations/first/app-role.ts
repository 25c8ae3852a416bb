/** What is written once: no role may change or delete it, and the server's role is not even granted to try. */
const writtenOnce = ['events', 'files', 'revisions']

const refuseChange = (table: string): string[] => [
  `create trigger ${table}_written_once before update or delete on ${table}
    for each row execute function refuse_change()`,
  `create trigger ${table}_never_emptied before truncate on ${table}
    for each statement execute function refuse_change()`,
  `revoke update, delete, truncate on ${table} from wadestone_app`,
]

/** The server's role: reads and writes rows, owns nothing, makes nothing. */
export const appRole: readonly string[] = [
  'revoke create on schema public from public',
  'grant usage on schema public to wadestone_app',
  'grant select, insert, update, delete on all tables in schema public to wadestone_app',
  'revoke insert, update, delete on migrations from wadestone_app',
  `create function refuse_change() returns trigger language plpgsql as $$
    begin
      raise exception 'rows of % are written once', tg_table_name using errcode = 'restrict_violation';
    end
  $$`,
  ...writtenOnce.flatMap(refuseChange),
]
