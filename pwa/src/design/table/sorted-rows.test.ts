import fc from 'fast-check';
import { expect, test } from 'vitest';
import { sortedRows, type Column } from './DataTable';

type Row = { readonly id: number; readonly heard: number | null };
const columns: Column<Row>[] = [
  { key: 'heard', header: 'heard', cell: (row) => row.heard, sortBy: (row) => row.heard },
];

test('should keep rows without a value last, whichever way it is sorted', () => {
  const rows = [
    { id: 1, heard: null },
    { id: 2, heard: 40 },
    { id: 3, heard: 90 },
  ];
  const ids = (descending: boolean) =>
    sortedRows(rows, columns, { key: 'heard', descending }).map((row) => row.id);
  expect(ids(true)).toEqual([3, 2, 1]);
  expect(ids(false)).toEqual([2, 3, 1]);
});

test('should never lose, add or shuffle equal rows', () => {
  fc.assert(
    fc.property(fc.array(fc.option(fc.integer({ min: 0, max: 5 }))), fc.boolean(), (values, descending) => {
      const rows = values.map((heard, id) => ({ id, heard }));
      const sorted = sortedRows(rows, columns, { key: 'heard', descending });
      expect([...sorted].sort((a, b) => a.id - b.id)).toEqual(rows);
      for (const [index, row] of sorted.entries()) {
        const next = sorted[index + 1];
        if (next && next.heard === row.heard) expect(next.id).toBeGreaterThan(row.id);
      }
    }),
  );
});
