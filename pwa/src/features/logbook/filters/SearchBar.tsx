import { useEffect, useRef, useState } from 'react';
import { Button } from '../../../design/button/Button';

/** After the last key, so that the address is not written at each. */
const SETTLE_MS = 300;

type SearchBarProps = {
  readonly search: string;
  /** Told at each key. */
  readonly onType: (search: string) => void;
  /** Told when the typing rests. */
  readonly onSettle: (search: string) => void;
  readonly narrowing: number;
  readonly onFilters: () => void;
};

/** The search over stations, remarks and frequencies, and the way to the filters. */
export function SearchBar({ search, onType, onSettle, narrowing, onFilters }: SearchBarProps) {
  const [text, setText] = useState(search);
  const settled = useRef(search);
  const timer = useRef<ReturnType<typeof setTimeout> | undefined>(undefined);
  useEffect(() => {
    if (search === settled.current) return;
    settled.current = search;
    setText(search);
  }, [search]);
  useEffect(() => () => clearTimeout(timer.current), []);
  const type = (next: string): void => {
    setText(next);
    onType(next);
    clearTimeout(timer.current);
    timer.current = setTimeout(() => {
      settled.current = next;
      onSettle(next);
    }, SETTLE_MS);
  };
  return (
    <div className="log-search">
      <input
        type="search"
        className="hm-input"
        aria-label="Search stations, remarks and frequencies"
        placeholder="Station, remark or kHz"
        autoComplete="off"
        value={text}
        onChange={(event) => type(event.target.value)}
      />
      <Button look="outline" onClick={onFilters}>
        {narrowing === 0 ? 'Filter' : `Filter · ${narrowing}`}
      </Button>
    </div>
  );
}
