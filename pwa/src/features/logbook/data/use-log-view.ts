import { useCallback, useEffect, useRef, useState } from 'react';
import { nowMs } from '../../../platform/clock';
import type { LogFilter } from '../index/log-filter';
import type { ShownRow } from '../index/log-view';
import type { LogView } from './desk-messages';
import type { LogClient } from './log-client';

/** Rows that are asked for together: a screen and its margins take one or two of them. */
const PAGE_ROWS = 60;

export type LogViewState =
  | { readonly kind: 'reading' }
  | { readonly kind: 'failed'; readonly message: string }
  | {
      readonly kind: 'ready';
      readonly view: LogView;
      /** False while the answer to a newer filter is on its way: the older one stays on the screen. */
      readonly isCurrent: boolean;
      /** A row by its place; undefined while it is on its way. */
      readonly rowAt: (place: number) => ShownRow | undefined;
      /** Asks for what is in sight, places `from` up to, not including, `to`. */
      readonly want: (from: number, to: number) => void;
    };

type Pages = { viewId: number; rows: Map<number, readonly ShownRow[]>; asked: Set<number> };

/** The log through a filter: heads and counts at once, rows as they come into sight, both kept current. */
export function useLogView(client: LogClient | null, filter: LogFilter): LogViewState {
  const asked = JSON.stringify(filter);
  /** The filter of the list that is shown: only then are the rows in sight the same ones. */
  const shownFor = useRef<string | null>(null);
  const [told, setTold] = useState<{ asked: string; view: LogView } | null>(null);
  const [failure, setFailure] = useState<string | null>(null);
  const { pages, want, inSight } = usePages(client, setFailure);

  useEffect(() => {
    if (!client) return;
    let isWanted = true;
    let isAsking = false;
    let isStale = false;
    /** One question at a time, so that a run of changes costs two answers and not one each. */
    const ask = async (): Promise<void> => {
      isStale = isAsking;
      if (isAsking) return;
      isAsking = true;
      try {
        const view = await client.ask({
          type: 'view',
          filter: JSON.parse(asked) as LogFilter,
          nowMs: nowMs(),
        });
        const sight = shownFor.current === asked ? inSight.current : { from: 0, to: 1 };
        const rows = await firstRows(client, view, sight);
        if (!isWanted || !rows) return;
        pages.current = rows;
        shownFor.current = asked;
        setFailure(null);
        setTold({ asked, view });
      } catch (error) {
        if (isWanted) setFailure(error instanceof Error ? error.message : String(error));
      } finally {
        isAsking = false;
        if (isStale && isWanted) void ask();
      }
    };
    void ask();
    const stop = client.onChange(() => void ask());
    return () => {
      isWanted = false;
      stop();
    };
  }, [client, asked, pages, inSight]);

  const rowAt = useCallback(
    (place: number) => pages.current.rows.get(Math.floor(place / PAGE_ROWS))?.[place % PAGE_ROWS],
    [pages],
  );
  if (failure !== null) return { kind: 'failed', message: failure };
  if (!told) return { kind: 'reading' };
  return { kind: 'ready', view: told.view, isCurrent: told.asked === asked, rowAt, want };
}

/** The pages of rows that were read of the present view. */
function usePages(client: LogClient | null, onFailure: (message: string) => void) {
  const pages = useRef<Pages>({ viewId: 0, rows: new Map(), asked: new Set() });
  const inSight = useRef({ from: 0, to: 1 });
  const [, redraw] = useState(0);
  const want = useCallback(
    (from: number, to: number): void => {
      inSight.current = { from, to };
      const now = pages.current;
      for (let page = Math.floor(from / PAGE_ROWS); page * PAGE_ROWS < to; page++) {
        if (!client || now.asked.has(page)) continue;
        now.asked.add(page);
        const range = { from: page * PAGE_ROWS, to: (page + 1) * PAGE_ROWS };
        client.ask({ type: 'rows', viewId: now.viewId, ...range }).then(
          (answer) => {
            if (!answer || pages.current !== now) return;
            now.rows.set(page, answer.rows);
            redraw((count) => count + 1);
          },
          (error: unknown) => onFailure(error instanceof Error ? error.message : String(error)),
        );
      }
    },
    [client, onFailure],
  );
  return { pages, want, inSight };
}

/** The rows in sight come with the new view, so that none flickers; null where a newer view has come between. */
async function firstRows(
  client: LogClient,
  { viewId }: LogView,
  sight: { from: number; to: number },
): Promise<Pages | null> {
  const first = Math.floor(sight.from / PAGE_ROWS);
  const last = Math.floor(Math.max(sight.from, sight.to - 1) / PAGE_ROWS);
  const numbers = Array.from({ length: last - first + 1 }, (_, offset) => first + offset);
  const answer = await client.ask({
    type: 'rows',
    viewId,
    from: first * PAGE_ROWS,
    to: (last + 1) * PAGE_ROWS,
  });
  if (!answer) return null;
  const rows = numbers.map(
    (page, offset) => [page, answer.rows.slice(offset * PAGE_ROWS, (offset + 1) * PAGE_ROWS)] as const,
  );
  return { viewId, rows: new Map(rows), asked: new Set(numbers) };
}
