import type { ReactNode } from 'react';
import './states.css';

type EmptyStateProps = {
  readonly title: string;
  /** What will stand here, and what to do for it. */
  readonly sentence: ReactNode;
  readonly action?: ReactNode;
};

/** Stands where a list has nothing yet: says what to do next. */
export function EmptyState({ title, sentence, action }: EmptyStateProps) {
  return (
    <div className="hm-state">
      <h2>{title}</h2>
      <p>{sentence}</p>
      {action ? <div className="hm-state-action">{action}</div> : null}
    </div>
  );
}
