import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { currentRoundNo, inRoundOrder, roundOf, type RoundEntry } from './round.js';

const target = (id: string, frequencyHz: number, name = id) => ({ id, fields: { frequencyHz, name } });
const entry = (
  id: string,
  targetId: string,
  roundNo: number,
  outcome: 'heard' | 'nil' = 'heard',
  deleted = false,
): RoundEntry => ({
  id,
  fields: { targetId, roundNo, outcome, deleted },
});
const targets = [
  target('a', 5_000_000),
  target('b', 6_070_000),
  target('c', 7_255_000),
  target('d', 11_730_000),
];
const allOnAir = () => true;

describe('a round', () => {
  it('should count answers, and mark the first row on the air without one as next', () => {
    const round = roundOf({
      targets,
      entries: [entry('1', 'a', 3), entry('2', 'b', 2)],
      roundNo: 3,
      isOnAir: allOnAir,
    });
    expect([round.answered, round.total, round.isDone]).toEqual([1, 4, false]);
    expect(round.rows.map((row) => row.isNext)).toEqual([false, true, false, false]);
  });

  it('should pass over rows that are off the air, and be done without them', () => {
    const round = roundOf({
      targets,
      entries: [entry('1', 'a', 1), entry('2', 'b', 1, 'nil'), entry('3', 'c', 1)],
      roundNo: 1,
      isOnAir: ({ id }) => id !== 'd',
    });
    expect(round.isDone).toBe(true);
    expect(round.rows.some((row) => row.isNext)).toBe(false);
  });

  it('should let the later entry speak for a row, and a deleted one not at all', () => {
    const entries = [
      entry('1', 'a', 1, 'nil'),
      entry('2', 'a', 1, 'heard'),
      entry('3', 'b', 1, 'heard', true),
    ];
    const round = roundOf({ targets, entries, roundNo: 1, isOnAir: allOnAir });
    expect(round.rows[0]?.entry?.id).toBe('2');
    expect(round.rows[1]?.entry).toBeNull();
  });

  it('should not be done when there is nothing to do', () => {
    expect(roundOf({ targets: [], entries: [], roundNo: 1, isOnAir: allOnAir }).isDone).toBe(false);
  });

  it('should go on from the highest round that is known here or in the entries', () => {
    expect(currentRoundNo([])).toBe(1);
    expect(currentRoundNo([entry('1', 'a', 2), entry('2', 'a', 5, 'heard', true)])).toBe(2);
    expect(currentRoundNo([entry('1', 'a', 2)], 3)).toBe(3);
  });

  it('should keep one order of rows, whatever order the records come in', () => {
    fc.assert(
      fc.property(
        fc.uniqueArray(
          fc.record({
            id: fc.string({ minLength: 1 }),
            frequencyHz: fc.integer({ min: 1000, max: 1005 }),
            name: fc.constantFrom('x', 'y'),
          }),
          {
            selector: ({ id }) => id,
          },
        ),
        (made) => {
          const rows = made.map(({ id, frequencyHz, name }) => target(id, frequencyHz, name));
          expect(inRoundOrder([...rows].reverse())).toEqual(inRoundOrder(rows));
        },
      ),
    );
  });
});
