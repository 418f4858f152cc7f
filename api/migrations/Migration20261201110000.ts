import { Migration } from '@mikro-orm/migrations';
import { INSTANT_NOT_NULL, STAMP } from './logbook-columns-20261201110000.js';
import { RECORD_COLUMNS, RECORD_KEYS, TABLES } from './logbook-tables-20261201110000.js';

/** Asked when something is deleted: does anything refer to it? */
const PARENT_INDEXES = [
  'setup (club_id, receiver_id)',
  'setup (club_id, antenna_id)',
  'outing (club_id, site_id)',
  'outing (club_id, current_setup_id)',
  'reception (club_id, site_id)',
  'reception (club_id, setup_id)',
  'dial_check (club_id, receiver_id)',
  'noise_reading (club_id, site_id)',
  'noise_reading (club_id, setup_id)',
];

const HISTORY = [
  'club_id uuid not null references club',
  'id uuid not null',
  'seq bigint check (seq > 0)',
  'record_type text not null',
  'record_id uuid not null',
  'field varchar(40) not null',
  'replaced_value jsonb not null',
  STAMP('replaced_stamp'),
  'kept_value jsonb not null',
  STAMP('kept_stamp'),
  'by_id uuid not null',
  'clash boolean not null',
  INSTANT_NOT_NULL('at'),
  'primary key (club_id, id)',
  'unique (club_id, seq)',
  'unique (club_id, record_type, record_id, field, replaced_stamp, kept_stamp)',
];

/** The tables of the logbook: one for each record type that a phone may write, and the history of their fields. */
export class Migration20261201110000 extends Migration {
  override up(): void {
    for (const [table, columns] of Object.entries(TABLES)) {
      this.addSql(`create table ${table} (${[...RECORD_COLUMNS, ...columns, ...RECORD_KEYS].join(', ')})`);
    }
    this.addSql(`create table history (${HISTORY.join(', ')})`);
    for (const index of PARENT_INDEXES) this.addSql(`create index on ${index}`);
  }

  override down(): void {
    for (const table of ['history', ...Object.keys(TABLES).reverse()]) this.addSql(`drop table ${table}`);
  }
}
