import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { readDays, readHours, readTimeOfDay } from './read-schedule';
import { guessMeanings, type ColumnMeaning } from './target-columns';
import { readTargets } from './read-targets';

const MEANINGS: ColumnMeaning[] = [
  'name',
  'frequency',
  'mode',
  'hours',
  'days',
  'latitude',
  'longitude',
  'note',
];
const row = (...cells: string[]) => cells;

describe('the columns of a file', () => {
  it('should be guessed from the headers, each meaning once', () => {
    expect(guessMeanings(['kHz', 'Station', 'Time', 'Lat', 'Lon', 'Site', 'Frequency'])).toEqual([
      'frequency',
      'name',
      'hours',
      'latitude',
      'longitude',
      'ignore',
      'ignore',
    ]);
  });
});

describe('hours and days', () => {
  it.each([
    ['0400', '04:00'],
    ['4:30', '04:30'],
    ['24:00', '00:00'],
  ])('should read %s as %s', (text, value) => {
    expect(readTimeOfDay(text)).toEqual({ ok: true, value });
  });

  it.each(['25:00', '12:60', '24:01', 'noon', ''])('should refuse the time %j', (text) => {
    expect(readTimeOfDay(text).ok).toBe(false);
  });

  it('should read days by name, number and range, over the week’s end too', () => {
    expect(readDays('Mo-Fr')).toEqual({ ok: true, value: [1, 2, 3, 4, 5] });
    expect(readDays('Sa Su')).toEqual({ ok: true, value: [6, 7] });
    expect(readDays('6-1')).toEqual({ ok: true, value: [1, 6, 7] });
    expect(readDays('1,3,5')).toEqual({ ok: true, value: [1, 3, 5] });
    expect(readDays('').ok && readDays('daily').ok).toBe(true);
    expect(readDays('Funday').ok).toBe(false);
  });

  it('should never throw, whatever stands in the cell', () => {
    fc.assert(
      fc.property(fc.string(), (text) => {
        for (const read of [readTimeOfDay, readHours, readDays]) expect(typeof read(text).ok).toBe('boolean');
      }),
    );
  });
});

describe('a file of targets', () => {
  it('should join the hours of one station on one frequency', () => {
    const { targets, faults } = readTargets(
      [
        row('Radio Lindholt', '6070', 'AM', '0400-0700', 'Mo-Fr', '53.4', '20.6', ''),
        row('Radio Lindholt', '6070', '', '1700-2000', '', '53.4', '20.6', ''),
        row('', '', '', '', '', '', '', ''),
        row('Tornby local', '98.4 MHz', 'FM', '', '', '', '', 'near'),
      ],
      MEANINGS,
      2,
    );
    expect(faults).toEqual([]);
    expect(targets.map((target) => [target.name, target.frequencyHz, target.schedule])).toEqual([
      [
        'Radio Lindholt',
        6_070_000,
        [
          { from: '04:00', to: '07:00', days: [1, 2, 3, 4, 5] },
          { from: '17:00', to: '20:00', days: [1, 2, 3, 4, 5, 6, 7] },
        ],
      ],
      ['Tornby local', 98_400_000, 'always'],
    ]);
  });

  it('should name row, column and what is wrong of each fault', () => {
    const { faults } = readTargets(
      [
        row('', '6070', 'AM', '', '', '', '', ''),
        row('A', 'six', 'AMX', '0400', 'Xy', '91', '0', ''),
        row('B', '5000', 'AM', '', '', '10', '', ''),
      ],
      MEANINGS,
      2,
    );
    const where = faults.map(({ row: at, column }) => `${at} ${column}`);
    expect(where).toContain('2 Name');
    expect(where).toContain('3 Frequency, kHz (or with MHz)');
    expect(where).toContain('3 Mode');
    expect(where).toContain('3 Hours as 0400-2000, UTC');
    expect(where).toContain('3 Days');
    expect(where).toContain('3 Transmitter latitude');
    expect(where).toContain('4 Transmitter longitude');
    for (const { message } of faults) expect(message.length).toBeGreaterThan(5);
  });

  it('should never make a target of a row that has a fault', () => {
    fc.assert(
      fc.property(
        fc.array(fc.array(fc.string(), { minLength: 8, maxLength: 8 }), { maxLength: 20 }),
        (rows) => {
          const read = readTargets(rows, MEANINGS, 1);
          const faulty = new Set(read.faults.map((fault) => fault.row));
          expect(read.targets.length).toBeLessThanOrEqual(read.rows - faulty.size);
        },
      ),
    );
  });
});
