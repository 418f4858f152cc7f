import { useVirtualizer } from '@tanstack/react-virtual';
import { useEffect, useMemo, useRef } from 'react';
import { lineAt, lineCount, type GroupHead, type ListLine } from '../index/log-view';
import type { LogViewState } from '../data/use-log-view';

export type ReadyView = Extract<LogViewState, { kind: 'ready' }>;
/** Heights of a line in rem: they grow with the size of the text. */
export type LineHeights = { readonly headRem: number; readonly rowRem: number };

const OVERSCAN_LINES = 8;

/** The lines of a list that are in sight, and the asking for their rows. */
export function useLines(state: ReadyView, heights: LineHeights) {
  const scroller = useRef<HTMLDivElement>(null);
  const { heads } = state.view;
  const remPx = useMemo(
    () => Number.parseFloat(getComputedStyle(document.documentElement).fontSize) || 16,
    [],
  );
  const headLines = useMemo(() => new Set(heads.map((head, number) => head.start + number)), [heads]);
  const virtual = useVirtualizer({
    count: lineCount(heads),
    getScrollElement: () => scroller.current,
    estimateSize: (line) => remPx * (headLines.has(line) ? heights.headRem : heights.rowRem),
    overscan: OVERSCAN_LINES,
    // a first frame with rows in it, before the element has been measured; also where nothing is ever laid out
    initialRect: { width: 390, height: 700 },
  });
  const measured = useRef(heads);
  useEffect(() => {
    if (measured.current === heads) return;
    measured.current = heads;
    virtual.measure();
  }, [virtual, heads]);
  const items = virtual.getVirtualItems();
  const places = placesOf(
    heads,
    items.map(({ index }) => index),
  );
  const { want } = state;
  const { from, to } = places;
  useEffect(() => {
    if (to > from) want(from, to);
  }, [want, from, to, state.view]);
  return { scroller, virtual, items, lineOf: (line: number): ListLine => lineAt(heads, line) };
}

function placesOf(heads: readonly GroupHead[], lines: readonly number[]): { from: number; to: number } {
  let from = Infinity;
  let to = 0;
  for (const line of lines) {
    const at = lineAt(heads, line);
    if (at.kind === 'head') continue;
    from = Math.min(from, at.place);
    to = Math.max(to, at.place + 1);
  }
  return to === 0 ? { from: 0, to: 0 } : { from, to };
}
