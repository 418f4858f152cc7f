import type { FilterCell, FilterSheet } from './filter-cells';
import './filters.css';

type FilterBarProps = {
  readonly cells: readonly FilterCell[];
  readonly onOpen: (sheet: FilterSheet) => void;
  /** True over the map of a phone, false along the top of a laptop. */
  readonly isOver: boolean;
};

/** What is shown, and the way to change it: each cell opens its sheet. */
export function FilterBar({ cells, onOpen, isOver }: FilterBarProps) {
  return (
    <div className={isOver ? 'cov-bar cov-panel' : 'cov-bar'} role="group" aria-label="Filters">
      {cells.map(({ sheet, name, value }) => (
        <button
          key={sheet}
          type="button"
          className={sheet === 'more' ? 'cov-bar-more' : undefined}
          aria-haspopup="dialog"
          onClick={() => onOpen(sheet)}
        >
          <span>{name}</span>
          <b className="num">{value}</b>
        </button>
      ))}
    </div>
  );
}
