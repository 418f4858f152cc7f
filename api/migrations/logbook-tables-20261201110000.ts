/** The tables as this migration makes them; later changes are later migrations. */

const FREQUENCY = 'between 1000 and 3000000000';
const INSTANT = 'between 631152000000 and 4102444800000';
const MODES = "in ('AM', 'SAM', 'USB', 'LSB', 'DSB', 'CW', 'FM', 'digital', 'other')";
const OBJECT = (column: string) => `jsonb not null check (jsonb_typeof(${column}) = 'object')`;
const OBJECT_OR_NULL = (column: string) => `jsonb check (jsonb_typeof(${column}) = 'object')`;
const LIST = (column: string) => `jsonb not null check (jsonb_typeof(${column}) = 'array')`;
const INSTANT_OR_NULL = (column: string) => `${column} bigint check (${column} ${INSTANT})`;
export const INSTANT_NOT_NULL = (column: string) => `${column} bigint not null check (${column} ${INSTANT})`;
const FREQUENCY_NOT_NULL = (column: string) => `${column} bigint not null check (${column} ${FREQUENCY})`;
/** Within a number column's limits; null passes. */
const RANGED = (column: string, type: string, low: number, high: number) =>
  `${column} ${type} check (${column} between ${low} and ${high})`;
const NOT_NULL_RANGED = (column: string, type: string, low: number, high: number) =>
  `${column} ${type} not null check (${column} between ${low} and ${high})`;
const PARENT = (column: string, table: string) =>
  `foreign key (club_id, ${column}) references ${table} (club_id, id)`;
const CLUB = 'foreign key (club_id) references club';
export const STAMP = (column: string) =>
  `${column} text collate "C" not null check (${column} ~ '^[0-9a-f]{16}[0-9a-z]{8}$')`;

/**
 * Every key of club data begins with club_id, foreign keys included. Tables without a parent that a row always
 * has refer to the club itself; the others are tied to it through that parent, which spares a check a row.
 */
export const RECORD_COLUMNS = [
  'club_id uuid not null',
  'id uuid not null',
  'owner_id uuid not null',
  'seq bigint not null check (seq > 0)',
  STAMP('stamp'),
  `stamps ${OBJECT_OR_NULL('stamps')}`,
  'received_at timestamptz not null default now()',
  'deleted boolean not null',
  'import_id uuid',
];
export const RECORD_KEYS = ['primary key (club_id, id)', 'unique (club_id, seq)'];

export const TABLES: Readonly<Record<string, readonly string[]>> = {
  site: [
    CLUB,
    'name varchar(60) not null',
    `place ${OBJECT('place')}`,
    "environment text not null check (environment in ('city', 'residential', 'rural', 'quiet-rural'))",
    'shared_use boolean not null',
    'notes varchar(4000)',
    INSTANT_OR_NULL('retired_at'),
  ],
  site_fix: [
    CLUB,
    `fix ${OBJECT('fix')}`,
    RANGED('elevation_m', 'double precision', -450, 9000),
    'home boolean not null',
  ],
  receiver: [
    CLUB,
    'name varchar(60) not null',
    `ranges ${LIST('ranges')}`,
    `meter_scale ${OBJECT('meter_scale')}`,
    'if_hz bigint[] check (cardinality(if_hz) <= 3)',
    'bandwidths_hz integer[] check (cardinality(bandwidths_hz) <= 12)',
    RANGED('supply_ma', 'double precision', 0.1, 5000),
    RANGED('battery_mah', 'double precision', 1, 1_000_000),
    RANGED('dial_step_hz', 'integer', 1, 1_000_000),
    'shared_use boolean not null',
    'replaces uuid',
    'notes varchar(4000)',
    INSTANT_OR_NULL('retired_at'),
  ],
  antenna: [
    CLUB,
    'name varchar(60) not null',
    "kind text not null check (kind in ('whip', 'wire', 'dipole', 'vertical', 'ferrite', 'loop', 'active', 'beam', 'other'))",
    RANGED('length_m', 'double precision', 0.01, 5000),
    RANGED('height_m', 'double precision', 0, 300),
    RANGED('azimuth_deg', 'double precision', 0, 359),
    RANGED('gain_db', 'double precision', -40, 40),
    'shared_use boolean not null',
    'replaces uuid',
    'notes varchar(4000)',
    INSTANT_OR_NULL('retired_at'),
  ],
  setup: [
    'receiver_id uuid not null',
    'antenna_id uuid not null',
    'coupling varchar(60)',
    NOT_NULL_RANGED('attenuation_db', 'double precision', 0, 80),
    NOT_NULL_RANGED('preamp_db', 'double precision', 0, 40),
    INSTANT_OR_NULL('retired_at'),
    PARENT('receiver_id', 'receiver'),
    PARENT('antenna_id', 'antenna'),
  ],
  target_list: [
    CLUB,
    'name varchar(60) not null',
    'edition varchar(40)',
    INSTANT_OR_NULL('valid_from'),
    INSTANT_OR_NULL('valid_to'),
    INSTANT_OR_NULL('published_at'),
  ],
  target: [
    'list_id uuid not null',
    'name varchar(80) not null',
    FREQUENCY_NOT_NULL('frequency_hz'),
    `mode text not null check (mode ${MODES})`,
    "schedule jsonb not null check (schedule = '\"always\"' or jsonb_typeof(schedule) = 'array')",
    `silences ${LIST('silences')}`,
    `tx ${OBJECT_OR_NULL('tx')}`,
    RANGED('power_kw', 'double precision', 0, 5000),
    'language varchar(40)',
    'note varchar(4000)',
    PARENT('list_id', 'target_list'),
  ],
  outing: [
    'site_id uuid not null',
    INSTANT_NOT_NULL('started_at'),
    `ended ${OBJECT_OR_NULL('ended')}`,
    'target_list_id uuid',
    'setup_ids uuid[] not null check (cardinality(setup_ids) between 1 and 6)',
    'current_setup_id uuid not null',
    'event_id uuid',
    `clock_steps ${LIST('clock_steps')}`,
    'notes varchar(4000)',
    PARENT('site_id', 'site'),
    PARENT('target_list_id', 'target_list'),
    PARENT('current_setup_id', 'setup'),
  ],
  swap_test: [
    'outing_id uuid not null',
    'setup_ids uuid[] not null check (cardinality(setup_ids) between 2 and 4)',
    'target_id uuid',
    `frequency_hz bigint check (frequency_hz ${FREQUENCY})`,
    "measure text not null check (measure in ('over-noise', 'level', 'score'))",
    NOT_NULL_RANGED('pairs_planned', 'integer', 6, 60),
    NOT_NULL_RANGED('gap_limit_s', 'integer', 10, 120),
    NOT_NULL_RANGED('dwell_s', 'integer', 5, 30),
    NOT_NULL_RANGED('seed', 'bigint', 0, 4_294_967_295),
    `ended ${OBJECT_OR_NULL('ended')}`,
    PARENT('outing_id', 'outing'),
    PARENT('target_id', 'target'),
  ],
  reception: [
    'outing_id uuid',
    'site_id uuid not null',
    'setup_id uuid not null',
    'target_id uuid',
    `target_hz bigint check (target_hz ${FREQUENCY})`,
    'event_id uuid',
    `swap ${OBJECT_OR_NULL('swap')}`,
    RANGED('round_no', 'integer', 1, 999),
    "outcome text not null check (outcome in ('heard', 'nil', 'skipped'))",
    "basis text not null check (basis in ('round', 'planned', 'chance', 'swap', 'import'))",
    "identity text not null check (identity in ('sure', 'tentative', 'unknown'))",
    "nil_reason text check (nil_reason in ('nothing', 'covered', 'noise', 'fault'))",
    INSTANT_NOT_NULL('device_at'),
    RANGED('duration_s', 'double precision', 0, 14_400),
    `tuning ${OBJECT('tuning')}`,
    RANGED('bandwidth_hz', 'integer', 1, 10_000_000),
    RANGED('attenuation_db', 'double precision', 0, 80),
    `sinpo ${OBJECT_OR_NULL('sinpo')}`,
    `rst ${OBJECT_OR_NULL('rst')}`,
    `meter ${OBJECT_OR_NULL('meter')}`,
    `noise_meter ${OBJECT_OR_NULL('noise_meter')}`,
    'carried text[] check (cardinality(carried) <= 7)',
    `programme jsonb check (jsonb_typeof(programme) = 'array')`,
    'remarks varchar(4000)',
    'station_name varchar(80)',
    'heard_by varchar(60)',
    `dial_hz bigint generated always as ((tuning->>'dialHz')::bigint) stored check (dial_hz ${FREQUENCY})`,
    `mode text generated always as (tuning->>'mode') stored check (mode ${MODES})`,
    PARENT('outing_id', 'outing'),
    PARENT('site_id', 'site'),
    PARENT('setup_id', 'setup'),
    PARENT('target_id', 'target'),
  ],
  clock_check: [
    CLUB,
    "device_id text not null check (device_id ~ '^[0-9a-z]{8}$')",
    INSTANT_NOT_NULL('device_at'),
    NOT_NULL_RANGED('offset_ms', 'bigint', -4_000_000_000_000, 4_000_000_000_000),
    NOT_NULL_RANGED('uncertainty_ms', 'integer', 0, 86_400_000),
    "method text not null check (method in ('tone', 'server', 'other'))",
    RANGED('path_km', 'double precision', 0, 40_100),
  ],
  dial_check: [
    'receiver_id uuid not null',
    INSTANT_NOT_NULL('at'),
    FREQUENCY_NOT_NULL('reference_hz'),
    FREQUENCY_NOT_NULL('dial_hz'),
    NOT_NULL_RANGED('error_ppm', 'double precision', -100_000, 100_000),
    NOT_NULL_RANGED('uncertainty_ppm', 'double precision', 0, 100_000),
    "method text not null check (method in ('zero-beat', 'beat-note', 'count'))",
    RANGED('temperature_c', 'double precision', -60, 80),
    PARENT('receiver_id', 'receiver'),
  ],
  noise_reading: [
    'site_id uuid not null',
    'setup_id uuid not null',
    INSTANT_NOT_NULL('at'),
    FREQUENCY_NOT_NULL('dial_hz'),
    NOT_NULL_RANGED('bandwidth_hz', 'integer', 1, 10_000_000),
    `meter ${OBJECT('meter')}`,
    PARENT('site_id', 'site'),
    PARENT('setup_id', 'setup'),
  ],
  attachment: [
    'reception_id uuid not null',
    "kind text not null check (kind in ('photo', 'sound'))",
    NOT_NULL_RANGED('bytes', 'integer', 1, 10_485_760),
    "sha256 text not null check (sha256 ~ '^[0-9a-f]{64}$')",
    INSTANT_OR_NULL('taken_at'),
    'caption varchar(200)',
    PARENT('reception_id', 'reception'),
  ],
};
