import { Migration } from '@mikro-orm/migrations';

/** Accounts, clubs and outgoing mail. Instants are bigint milliseconds UTC; keys of club data begin with the club. */
export class Migration20261201100000 extends Migration {
  override up(): void {
    for (const statement of [...ACCOUNT_TABLES, ...CLUB_TABLES]) this.addSql(statement);
  }
}

/** Rows of one transaction may come in any order; their references are checked at its end. */
const LATE = 'deferrable initially deferred';

const ACCOUNT_TABLES = [
  `create table account (
    id uuid primary key,
    email varchar(254) not null unique check (email = lower(email)),
    name varchar(60) not null,
    password_hash text not null,
    created_at bigint not null,
    confirmed_at bigint
  )`,
  `create table device_session (
    id uuid primary key,
    account_id uuid not null references account on delete cascade ${LATE},
    device_id varchar(8) not null,
    device_name varchar(60) not null,
    created_at bigint not null,
    last_seen_at bigint not null,
    current_hash text,
    pending_hash text not null,
    ended_at bigint,
    end_reason text check (end_reason in ('signed-out', 'signed-in-again', 'reuse', 'reset')),
    check ((ended_at is null) = (end_reason is null))
  )`,
  'create index device_session_account on device_session (account_id)',
  `create table refresh_token (
    token_hash text primary key,
    session_id uuid not null references device_session on delete cascade ${LATE},
    issued_at bigint not null
  )`,
  'create index refresh_token_session on refresh_token (session_id, issued_at)',
  `create table mail_token (
    id uuid primary key,
    token_hash text not null unique,
    account_id uuid not null references account on delete cascade ${LATE},
    purpose text not null check (purpose in ('confirm', 'reset')),
    expires_at bigint not null,
    used_at bigint
  )`,
  'create index mail_token_account on mail_token (account_id)',
  `create table attempt_count (
    key_hash text primary key,
    tries integer not null check (tries >= 0),
    first_at bigint not null,
    last_at bigint not null
  )`,
  'create index attempt_count_last on attempt_count (last_at)',
  `create table outgoing_mail (
    id uuid primary key,
    kind text not null check (kind in ('confirm', 'reset', 'sign-up-known')),
    to_email varchar(254) not null,
    to_name varchar(60) not null,
    mail_token_id uuid not null references mail_token on delete cascade ${LATE},
    tries integer not null,
    next_try_at bigint not null
  )`,
  'create index outgoing_mail_next on outgoing_mail (next_try_at)',
];

const CLUB_TABLES = [
  `create table club (
    club_id uuid primary key,
    kind text not null check (kind in ('club', 'my-log')),
    name varchar(60) not null,
    itu_region smallint not null check (itu_region between 1 and 3),
    demo boolean not null,
    seq bigint not null check (seq >= 0),
    history_id uuid not null,
    created_at bigint not null,
    join_code_hash text,
    join_code_expires_at bigint,
    join_code_uses_left integer not null check (join_code_uses_left >= 0),
    check (kind = 'club' or join_code_hash is null)
  )`,
  // an index and no key: a code is looked up before the club is known
  'create index club_join_code on club (join_code_hash) where join_code_hash is not null',
  `create table membership (
    club_id uuid not null references club on delete cascade ${LATE},
    account_id uuid not null references account ${LATE},
    name varchar(60) not null,
    role text not null check (role in ('member', 'organizer', 'admin')),
    joined_at bigint not null,
    left_at bigint,
    seq bigint not null,
    stamp char(24) not null,
    primary key (club_id, account_id)
  )`,
  'create index membership_feed on membership (club_id, seq)',
  'create index membership_account on membership (account_id)',
];
