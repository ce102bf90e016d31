import { type Migration } from './migration'

/** Organisations, the people who work for them, and how they sign in. */
export const peopleAndOrganisations: Migration = {
  name: '001-people-and-organisations',
  up: [
    `create table organisations (
      id uuid not null primary key,
      slug varchar(60) character set ascii collate ascii_bin not null unique,
      name varchar(160) not null,
      kind enum('provider','landlord') not null,
      nation enum('england','wales','scotland','northern-ireland') not null,
      notice_days smallint unsigned not null default 90 comment 'a report this close to its end is due [days]',
      created_at datetime(3) not null default current_timestamp(3)
    )`,
    `create table people (
      id uuid not null primary key,
      email varchar(254) not null unique,
      name varchar(120) not null,
      password_hash varchar(200) character set ascii collate ascii_bin null,
      created_at datetime(3) not null default current_timestamp(3)
    )`,
    `create table memberships (
      organisation_id uuid not null,
      person_id uuid not null,
      role enum('manager','officer','auditor','supervisor','electrician') not null,
      sees_all_patches boolean not null default true,
      created_at datetime(3) not null default current_timestamp(3),
      ended_at datetime(3) null,
      primary key (organisation_id, person_id),
      key by_person (person_id),
      foreign key (organisation_id) references organisations (id),
      foreign key (person_id) references people (id)
    )`,
    `create table patches (
      organisation_id uuid not null,
      id uuid not null,
      name varchar(120) not null,
      primary key (organisation_id, id),
      unique key one_name (organisation_id, name),
      foreign key (organisation_id) references organisations (id)
    )`,
    `create table membership_patches (
      organisation_id uuid not null,
      person_id uuid not null,
      patch_id uuid not null,
      primary key (organisation_id, person_id, patch_id),
      foreign key (organisation_id, person_id) references memberships (organisation_id, person_id),
      foreign key (organisation_id, patch_id) references patches (organisation_id, id)
    )`,
    `create table sessions (
      id uuid not null primary key,
      person_id uuid not null,
      organisation_id uuid not null,
      created_at datetime(3) not null default current_timestamp(3),
      expires_at datetime(3) not null,
      ended_at datetime(3) null,
      key by_person (person_id, ended_at),
      foreign key (person_id) references people (id),
      foreign key (organisation_id) references organisations (id)
    )`,
    `create table invitations (
      organisation_id uuid not null,
      id uuid not null,
      email varchar(254) not null,
      role enum('manager','officer','auditor','supervisor','electrician') not null,
      patch_ids json not null,
      token_hash char(64) character set ascii collate ascii_bin not null unique,
      invited_by uuid not null,
      created_at datetime(3) not null default current_timestamp(3),
      expires_at datetime(3) not null,
      accepted_at datetime(3) null,
      withdrawn_at datetime(3) null,
      primary key (organisation_id, id),
      key by_email (organisation_id, email),
      foreign key (organisation_id) references organisations (id),
      foreign key (invited_by) references people (id)
    )`,
    `create table password_resets (
      id uuid not null primary key,
      person_id uuid not null,
      token_hash char(64) character set ascii collate ascii_bin not null unique,
      created_at datetime(3) not null default current_timestamp(3),
      expires_at datetime(3) not null,
      used_at datetime(3) null,
      key by_person (person_id),
      foreign key (person_id) references people (id)
    )`,
    // rate-limiter-flexible's own shape, made here because the application user may not create tables
    `create table rate_limits (
      \`key\` varchar(255) character set ascii collate ascii_bin not null primary key,
      points int not null default 0,
      expire bigint unsigned null,
      key by_expiry (expire)
    )`,
  ],
  down: [
    'rate_limits',
    'password_resets',
    'invitations',
    'sessions',
    'membership_patches',
    'patches',
    'memberships',
    'people',
    'organisations',
  ].map((table) => `drop table ${table}`),
}
