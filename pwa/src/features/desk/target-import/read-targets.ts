import { readFrequency } from '@harkmoor/sync-model/radio/bands/frequency-text';
import { MODES, type Mode } from '@harkmoor/sync-model/records/common-fields';
import { targetSchema, type ScheduleSlot, type Target } from '@harkmoor/sync-model/records/target';
import { schemaFaults } from '../../../platform/schema-faults';
import { MEANING_WORDS, type ColumnMeaning } from './target-columns';
import { readDays, readHours, readTimeOfDay, sameSlot, type Read } from './read-schedule';

/** One fault of a file: the row as a spreadsheet counts it, the column, what is wrong. */
export type ImportFault = { readonly row: number; readonly column: string; readonly message: string };

export type NewTarget = Omit<Target, 'listId' | 'importId'>;
export type ReadTargets = {
  readonly targets: NewTarget[];
  readonly faults: ImportFault[];
  readonly rows: number;
};

type Cells = Partial<Record<ColumnMeaning, string>>;

/**
 * Reads the rows of a file by what its columns mean. Rows of one name, frequency and mode become one target with
 * their hours together. Faults name row and column; a caller takes all targets or, where there is a fault, none.
 */
export function readTargets(
  rows: readonly (readonly string[])[],
  meanings: readonly ColumnMeaning[],
  firstRow: number,
): ReadTargets {
  const faults: ImportFault[] = [];
  const targets = new Map<string, NewTarget>();
  let read = 0;
  rows.forEach((row, at) => {
    if (row.every((cell) => cell.trim() === '')) return;
    read += 1;
    const cells = cellsOf(row, meanings);
    const { target, faults: own } = readRow(cells);
    faults.push(...own.map(({ column, message }) => ({ row: firstRow + at, column, message })));
    if (own.length === 0) join(targets, target);
  });
  return { targets: [...targets.values()], faults, rows: read };
}

function cellsOf(row: readonly string[], meanings: readonly ColumnMeaning[]): Cells {
  const cells: Cells = {};
  meanings.forEach((meaning, at) => {
    if (meaning !== 'ignore') cells[meaning] = (row[at] ?? '').trim().normalize('NFC');
  });
  return cells;
}

type RowFault = Omit<ImportFault, 'row'>;

function readRow(cells: Cells): { target: NewTarget; faults: RowFault[] } {
  const faults: RowFault[] = [];
  const take = <T>(meaning: ColumnMeaning, read: Read<T>, otherwise: T): T => {
    if (read.ok) return read.value;
    faults.push({ column: MEANING_WORDS[meaning], message: read.message });
    return otherwise;
  };
  const target: NewTarget = {
    deleted: false,
    name: cells.name ?? '',
    frequencyHz: take('frequency', readHz(cells.frequency ?? ''), 1000),
    mode: take('mode', readMode(cells.mode ?? ''), 'AM'),
    schedule: readSlot(cells, take),
    silences: [],
    tx: readTransmitter(cells, take),
    powerKw: take('powerKw', readFigure(cells.powerKw ?? ''), null),
    language: cells.language || null,
    note: cells.note || null,
  };
  const checked = targetSchema.omit({ listId: true, importId: true });
  for (const { field, message } of schemaFaults(checked, target)) {
    const meaning =
      FIELD_MEANINGS[field.split('.').slice(0, 2).join('.')] ?? FIELD_MEANINGS[field.split('.')[0] ?? ''];
    faults.push({ column: meaning ? MEANING_WORDS[meaning] : field, message });
  }
  return { target, faults };
}

const FIELD_MEANINGS: Record<string, ColumnMeaning> = {
  name: 'name',
  frequencyHz: 'frequency',
  mode: 'mode',
  'tx.latDeg': 'latitude',
  'tx.lonDeg': 'longitude',
  powerKw: 'powerKw',
  language: 'language',
  note: 'note',
};

type Take = <T>(meaning: ColumnMeaning, read: Read<T>, otherwise: T) => T;

function readSlot(cells: Cells, take: Take): Target['schedule'] {
  const days = take('days', readDays(cells.days ?? ''), [1]);
  if (cells.hours) {
    const hours = take('hours', readHours(cells.hours), { from: '00:00', to: '00:00' });
    return [{ ...hours, days }];
  }
  if (!cells.from && !cells.to) return days.length === 7 ? 'always' : [{ from: '00:00', to: '00:00', days }];
  const from = take('from', readTimeOfDay(cells.from ?? ''), '00:00');
  const to = take('to', readTimeOfDay(cells.to ?? ''), '00:00');
  return [{ from, to, days }];
}

function readTransmitter(cells: Cells, take: Take): Target['tx'] {
  const latDeg = take('latitude', readFigure(cells.latitude ?? ''), null);
  const lonDeg = take('longitude', readFigure(cells.longitude ?? ''), null);
  if (latDeg === null && lonDeg === null) return null;
  const missing = latDeg === null ? 'latitude' : 'longitude';
  if (latDeg === null || lonDeg === null) {
    return take<Target['tx']>(
      missing,
      { ok: false, message: 'A transmitter needs latitude and longitude' },
      null,
    );
  }
  return { latDeg, lonDeg };
}

function readHz(text: string): Read<number> {
  const reading = readFrequency(text);
  if (reading.kind === 'frequency') return { ok: true, value: reading.frequencyHz };
  const message = reading.kind === 'refused' ? reading.message : `“${text}” is a metre band, no frequency`;
  return { ok: false, message: text === '' ? 'A target needs a frequency' : message };
}

function readMode(text: string): Read<Mode> {
  if (text === '') return { ok: true, value: 'AM' };
  const found = MODES.find((mode) => mode.toLowerCase() === text.toLowerCase());
  return found
    ? { ok: true, value: found }
    : { ok: false, message: `“${text}” is none of ${MODES.join(', ')}` };
}

function readFigure(text: string): Read<number | null> {
  if (text === '') return { ok: true, value: null };
  const figure = Number(text.replace('\u2212', '-').replace(',', '.'));
  return Number.isFinite(figure)
    ? { ok: true, value: figure }
    : { ok: false, message: `“${text}” is no number` };
}

/** A further row of a known target adds its hours. */
function join(targets: Map<string, NewTarget>, target: NewTarget): void {
  const key = JSON.stringify([target.name, target.frequencyHz, target.mode]);
  const known = targets.get(key);
  if (!known) targets.set(key, target);
  else if (known.schedule !== 'always')
    targets.set(key, { ...known, schedule: joined(known.schedule, target.schedule) });
}

function joined(slots: ScheduleSlot[], more: Target['schedule']): Target['schedule'] {
  if (more === 'always') return 'always';
  return [...slots, ...more.filter((slot) => !slots.some((known) => sameSlot(known, slot)))];
}
