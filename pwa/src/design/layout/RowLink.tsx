import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import './section.css';

type RowLinkProps = {
  readonly to: string;
  readonly name: ReactNode;
  /** A second line in soft ink. */
  readonly note?: ReactNode;
  /** At the right: a figure, a state mark. */
  readonly aside?: ReactNode;
};

/** A line of a list that opens another screen; the whole line is the target. */
export function RowLink({ to, name, note, aside }: RowLinkProps) {
  return (
    <Link to={to} className="hm-row-link">
      <div>
        <div className="hm-row-name">{name}</div>
        {note ? <div className="hm-row-note">{note}</div> : null}
      </div>
      {aside ?? (
        <svg width="12" height="20" viewBox="0 0 12 20" aria-hidden="true">
          <path
            d="M2.5 4 8.5 10l-6 6"
            fill="none"
            stroke="currentColor"
            strokeWidth="2.5"
            strokeLinecap="round"
          />
        </svg>
      )}
    </Link>
  );
}
