import { channelLookup } from '@harkmoor/sync-model/evidence/channel-lookup';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { OWN, rowTest, WHOLE_LOG, type LogFilter } from './log-filter';
import { LogIndex } from './log-index';
import type { LogNames } from './log-names';
import type { LogRow } from './log-row';
import { groupHeads, lineAt, lineCount, lineOfPlace, type GroupHead } from './log-view';
import { folded } from './search-text';

const NOW = Date.UTC(2026, 10, 20);
const names: LogNames = {
  region: 1,
  ownId: 'me',
  targets: new Map([['t1', 'Radio Lindholt']]),
  sites: new Map([
    ['dune', 'Ravnklit dune'],
    ['heath', 'Tofte heath'],
  ]),
  antennas: new Map([['s1', { antennaId: 'a1', name: 'Long wire' }]]),
  people: new Map([['them', 'Sine Aagård']]),
  outings: new Map([
    ['o1', { startedAt: Date.UTC(2026, 10, 12, 18), siteId: 'dune' }],
    ['o2', { startedAt: Date.UTC(2026, 10, 14, 23, 50), siteId: 'heath' }],
  ]),
  clashes: new Set(),
};

function aRow(over: Partial<LogRow> & { id: string }): LogRow {
  return {
    ownerId: 'me',
    outingId: 'o1',
    siteId: 'dune',
    setupId: 's1',
    targetId: null,
    targetHz: null,
    stationName: null,
    dialHz: 6_070_000,
    deviceAt: Date.UTC(2026, 10, 12, 18, 43),
    outcome: 'heard',
    nilReason: null,
    sinpo: null,
    rst: null,
    carried: null,
    remarks: '',
    owed: 'none',
    binnedAt: null,
    ...over,
  };
}

function found(rows: readonly LogRow[], filter: Partial<LogFilter>): string[] {
  const index = new LogIndex();
  for (const row of rows) index.put(row);
  const passes = rowTest({ ...WHOLE_LOG, ...filter }, { names, channels: channelLookup(1), nowMs: NOW });
  return index.groups(passes, names).flatMap((group) => group.rows.map(({ id }) => id));
}

describe('the order of the log', () => {
  it('should put the newest outing first, and name it by the UTC date of its start', () => {
    const index = new LogIndex();
    index.put(aRow({ id: 'a', deviceAt: Date.UTC(2026, 10, 12, 18, 1) }));
    index.put(aRow({ id: 'b', outingId: 'o2', deviceAt: Date.UTC(2026, 10, 15, 0, 20) }));
    index.put(aRow({ id: 'c', deviceAt: Date.UTC(2026, 10, 12, 18, 2) }));
    const groups = index.groups(() => true, names);
    expect(groups.map(({ rows }) => rows.map(({ id }) => id))).toEqual([['b'], ['c', 'a']]);
    // the outing began before midnight: it keeps that date for what was logged after it
    expect(groups[0]!.atMs).toBe(Date.UTC(2026, 10, 14, 23, 50));
    expect(groupHeads(groups, names)[0]).toMatchObject({ siteName: 'Tofte heath', count: 1, start: 0 });
  });

  it('should keep entries without an outing together by person, place and UTC date', () => {
    const loose = { outingId: null, deviceAt: Date.UTC(2026, 10, 1, 9) };
    const index = new LogIndex();
    index.put(aRow({ id: 'a', ...loose }));
    index.put(aRow({ id: 'b', ...loose, deviceAt: loose.deviceAt + 60_000 }));
    index.put(aRow({ id: 'c', ...loose, ownerId: 'them' }));
    expect(index.groups(() => true, names).map(({ rows }) => rows.length)).toEqual([2, 1]);
  });

  it('should hold a row once however often it is put, and drop what was removed', () => {
    const index = new LogIndex();
    index.put(aRow({ id: 'a' }));
    index.put(aRow({ id: 'a', outingId: 'o2' }));
    expect(index.groups(() => true, names).map(({ outingId }) => outingId)).toEqual(['o2']);
    index.remove('a');
    expect([index.size, index.groups(() => true, names)]).toEqual([0, []]);
  });

  it('should always give every row its own line, and the line its row', () => {
    fc.assert(
      fc.property(fc.array(fc.integer({ min: 1, max: 9 }), { minLength: 1, maxLength: 30 }), (counts) => {
        let start = 0;
        const heads = counts.map((count, number): GroupHead => {
          const head = {
            key: String(number),
            atMs: 0,
            siteName: '',
            hasOuting: true,
            operator: null,
            count,
            start,
          };
          start += count;
          return head;
        });
        const lines = Array.from({ length: lineCount(heads) }, (_, line) => lineAt(heads, line));
        expect(lines.filter(({ kind }) => kind === 'head')).toHaveLength(heads.length);
        const places = lines.flatMap((line) => (line.kind === 'row' ? [line.place] : []));
        expect(places).toEqual(Array.from({ length: start }, (_, place) => place));
        for (const place of places) {
          expect(lines[lineOfPlace(heads, place)]).toEqual({ kind: 'row', place });
        }
      }),
    );
  });
});

describe('what is found', () => {
  const rows = [
    aRow({ id: 'target', targetId: 't1' }),
    aRow({
      id: 'named',
      stationName: 'Skovtóp tone',
      dialHz: 5_000_200,
      deviceAt: Date.UTC(2026, 10, 13, 5),
    }),
    aRow({ id: 'remark', outcome: 'nil', remarks: folded('Færøerne? faint carrier'), dialHz: 145_500_000 }),
    aRow({ id: 'theirs', ownerId: 'them', siteId: 'heath', owed: 'refused', dialHz: 11_730_000 }),
    aRow({ id: 'binned', binnedAt: NOW - 1000 }),
    aRow({ id: 'gone', binnedAt: NOW - 31 * 86_400_000 }),
    aRow({ id: 'their bin', ownerId: 'them', binnedAt: NOW - 1000 }),
  ];

  it.each<[string, Partial<LogFilter>, string[]]>([
    ['the beginning of a word of the target', { search: 'lind' }, ['target']],
    ['a name without its accent', { search: 'SKOVTOP' }, ['named']],
    ['a word of the remarks', { search: 'carr' }, ['remark']],
    ['words that all have to be there', { search: 'faint lind' }, []],
    ['no middle of a word', { search: 'indholt' }, []],
    ['a frequency in kHz, near the dial', { search: '5000' }, ['named']],
    ['a frequency in MHz', { search: '145.5 MHz' }, ['remark']],
    ['a band', { band: '25 m broadcast' }, ['theirs']],
    ['an outcome', { outcome: 'nil' }, ['remark']],
    ['a station', { station: 'Radio Lindholt' }, ['target']],
    ['a site', { siteId: 'heath' }, ['theirs']],
    ['an operator', { operatorId: 'them' }, ['theirs']],
    ['one’s own', { operatorId: OWN, outcome: 'nil' }, ['remark']],
    ['a UTC date', { fromDate: '2026-11-13', toDate: '2026-11-13' }, ['named']],
    ['what needs attention', { state: 'needs-attention' }, ['theirs']],
    ['one’s own bin of 30 days', { bin: true }, ['binned']],
  ])('should be %s', (_, filter, ids) => {
    expect(found(rows, filter)).toEqual(ids);
  });

  it('should never show what lies in the bin among the rest', () => {
    expect(found(rows, {}).sort()).toEqual(['named', 'remark', 'target', 'theirs']);
  });
});
