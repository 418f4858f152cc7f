import { channelLookup } from '@harkmoor/sync-model/evidence/channel-lookup';
import { rowTest, WHOLE_LOG, type RowTest } from '../index/log-filter';
import { logChoices } from '../index/log-choices';
import type { LogNames } from '../index/log-names';
import type { LogRow } from '../index/log-row';
import { groupHeads, shownRow } from '../index/log-view';
import type { Ask, AnswerTo, LogAddress, LogDesk, LogView, RowWindow } from './desk-messages';
import { LogReader } from './log-reader';

/**
 * Answers about a log without ever holding its records: which groups and how many rows pass a filter, and the rows
 * of one window of them. It runs in a worker where there are workers. `onChange` is called when an answer may
 * have become another.
 */
export function openLogDesk(address: LogAddress, onChange: () => void): LogDesk {
  const reader = new LogReader(address, onChange);
  const channels = channelLookup(address.region);
  let shown: { viewId: number; rows: readonly LogRow[]; names: LogNames } = {
    viewId: 0,
    rows: [],
    names: noNames(address),
  };

  async function view({ filter, nowMs }: Extract<Ask, { type: 'view' }>): Promise<LogView> {
    const { index, names, heldCount, isComplete } = await reader.held();
    const groups = index.groups(rowTest(filter, { names, channels, nowMs }), names);
    shown = { viewId: shown.viewId + 1, rows: groups.flatMap(({ rows }) => rows), names };
    return {
      viewId: shown.viewId,
      heads: groupHeads(groups, names),
      shownCount: shown.rows.length,
      ofCount: countOf(index.rows(), rowTest({ ...WHOLE_LOG, bin: filter.bin }, { names, channels, nowMs })),
      readCount: index.size,
      heldCount,
      isComplete,
    };
  }
  function rows({ viewId, from, to }: Extract<Ask, { type: 'rows' }>): RowWindow {
    if (viewId !== shown.viewId) return null;
    return { from, rows: shown.rows.slice(from, to).map((row) => shownRow(row, shown.names)) };
  }
  async function answer(ask: Ask): Promise<AnswerTo<Ask>> {
    switch (ask.type) {
      case 'view':
        return view(ask);
      case 'rows':
        return rows(ask);
      case 'choices': {
        const { index, names } = await reader.held();
        return logChoices(index.rows(), names, channels);
      }
    }
  }
  return {
    ask: <A extends Ask>(ask: A) => answer(ask) as Promise<AnswerTo<A>>,
    watch: (isWatched) => reader.watch(isWatched),
    close: () => reader.close(),
  };
}

function noNames({ region, ownId }: LogAddress): LogNames {
  const none = new Map<string, never>();
  return {
    ...{ region, ownId, clashes: new Set() },
    ...{ targets: none, sites: none, antennas: none, people: none, outings: none },
  };
}

function countOf(rows: Iterable<LogRow>, passes: RowTest): number {
  let count = 0;
  for (const row of rows) if (passes(row)) count += 1;
  return count;
}
