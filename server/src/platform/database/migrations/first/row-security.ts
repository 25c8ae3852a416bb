/**
 * A district sees its own rows and nothing else, whatever a query forgets to ask for. The unit of work says which
 * district by a setting that ends with its transaction; without one every table is empty.
 */
const inDistrict = 'district_id = wadestone_district()'

/** Sign-in has to look before a district is known: these few tables open to it as well. */
const inDistrictOrSigningIn = `${inDistrict} or wadestone_signing_in()`

const districtTables = [
  'district_settings',
  'criteria_sets',
  'cost_lists',
  'payment_schedules',
  'schedule_lines',
  'producers',
  'jobs',
  'job_producers',
  'surveys',
  'designs',
  'revisions',
  'variances',
  'packets',
  'page_readings',
  'technical_checks',
  'consents',
  'signatures',
  'approvals',
  'notes',
  'note_answers',
  'mail_messages',
  'events',
  'files',
  'idempotency_keys',
]

const accountTables = ['memberships', 'sessions', 'entry_links', 'entry_codes']

const protect = (table: string, visible: string, writable = visible): string[] => [
  `alter table ${table} enable row level security`,
  `alter table ${table} force row level security`,
  `create policy ${table}_of_district on ${table} using (${visible}) with check (${writable})`,
]

const personHere = `exists (
  select 1 from memberships m where m.person_id = people.id and m.district_id = wadestone_district()
)`

export const rowSecurity: readonly string[] = [
  `create function wadestone_district() returns uuid language sql stable
    as $$ select nullif(current_setting('wadestone.district', true), '')::uuid $$`,
  `create function wadestone_signing_in() returns boolean language sql stable
    as $$ select coalesce(current_setting('wadestone.accounts', true), '') = 'on' $$`,
  ...districtTables.flatMap((table) => protect(table, inDistrict)),
  ...accountTables.flatMap((table) => protect(table, inDistrictOrSigningIn)),
  ...protect('districts', 'id = wadestone_district() or wadestone_signing_in()'),
  ...protect('people', `wadestone_signing_in() or ${personHere}`, 'wadestone_signing_in()'),
  ...protect('sign_in_attempts', 'wadestone_signing_in()'),
]
