export const platformTables: readonly string[] = [
  `create table events (
    district_id uuid not null,
    stream_id uuid not null,
    sequence integer not null,
    kind text not null,
    actor_id uuid,
    at timestamptz(3) not null,
    facts jsonb not null,
    previous_hash text not null,
    row_hash text not null,
    constraint pk_events primary key (district_id, stream_id, sequence)
  )`,
  `create table files (
    district_id uuid not null,
    id uuid not null,
    sha256 text not null,
    content_type text not null,
    size_bytes integer not null,
    bytes bytea not null,
    created_by uuid,
    created_at timestamptz(3) not null,
    constraint pk_files primary key (district_id, id)
  )`,
  `create table idempotency_keys (
    district_id uuid not null,
    person_id uuid not null,
    key text not null,
    fingerprint text not null,
    answer jsonb,
    created_at timestamptz(3) not null,
    constraint pk_idempotency_keys primary key (district_id, person_id, key)
  )`,
  `create index ix_idempotency_keys_created_at on idempotency_keys (created_at)`,
]
