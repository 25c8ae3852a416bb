export const accountsTables: readonly string[] = [
  `create table people (
    id uuid not null,
    name text not null,
    email text not null,
    password_hash text,
    is_active boolean not null default true,
    created_at timestamptz(3) not null,
    constraint uq_people_email unique (email),
    constraint pk_people primary key (id)
  )`,
  `create table memberships (
    district_id uuid not null,
    person_id uuid not null,
    roles text array not null,
    approval_limits jsonb,
    is_active boolean not null default true,
    created_at timestamptz(3) not null,
    constraint pk_memberships primary key (district_id, person_id)
  )`,
  `create index ix_memberships_person_id on memberships (person_id)`,
  `create table sessions (
    id uuid not null,
    district_id uuid not null,
    person_id uuid not null,
    job_id uuid,
    started_at timestamptz(3) not null,
    last_seen_at timestamptz(3) not null,
    expires_at timestamptz(3) not null,
    revoked_at timestamptz(3),
    user_agent text not null,
    constraint pk_sessions primary key (id)
  )`,
  `create index ix_sessions_person_id on sessions (district_id, person_id)`,
  `create table sign_in_attempts (
    key text not null,
    failures integer not null,
    last_tried_at timestamptz(3) not null,
    blocked_until timestamptz(3),
    constraint pk_sign_in_attempts primary key (key)
  )`,
  `create table entry_links (
    id uuid not null,
    district_id uuid not null,
    person_id uuid not null,
    job_id uuid not null,
    token_hash text not null,
    created_at timestamptz(3) not null,
    expires_at timestamptz(3) not null,
    revoked_at timestamptz(3),
    constraint uq_entry_links_token_hash unique (token_hash),
    constraint pk_entry_links primary key (id)
  )`,
  `create index ix_entry_links_job_id on entry_links (district_id, job_id)`,
  `create table entry_codes (
    id uuid not null,
    district_id uuid not null,
    link_id uuid not null,
    code_hash text not null,
    created_at timestamptz(3) not null,
    expires_at timestamptz(3) not null,
    tries integer not null default 0,
    used_at timestamptz(3),
    constraint pk_entry_codes primary key (id)
  )`,
  `create index ix_entry_codes_link_id_created_at on entry_codes (link_id, created_at)`,
]
