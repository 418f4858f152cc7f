import type { ReactNode } from 'react';
import './caution.css';

type CautionProps = {
  readonly title: string;
  readonly children: ReactNode;
  /** Absent where the reminder has to stay. */
  readonly onDismiss?: () => void;
};

/** A reminder before something that can hurt: brief, with a mark beside the word, dismissible. */
export function Caution({ title, children, onDismiss }: CautionProps) {
  return (
    <aside className="hm-caution" aria-label={title}>
      <div className="hm-caution-head">
        <svg width="20" height="20" viewBox="0 0 20 20" aria-hidden="true">
          <path
            d="M10 2.5 18.5 17.5H1.5Z"
            fill="none"
            stroke="currentColor"
            strokeWidth="2"
            strokeLinejoin="round"
          />
          <path d="M10 7.5v5M10 14.2v1.3" stroke="currentColor" strokeWidth="2" />
        </svg>
        <h2>{title}</h2>
        {onDismiss ? (
          <button type="button" onClick={onDismiss}>
            Understood
          </button>
        ) : null}
      </div>
      <div className="hm-caution-body">{children}</div>
    </aside>
  );
}
