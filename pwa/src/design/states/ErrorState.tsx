import type { ReactNode } from 'react';
import './states.css';

type ErrorStateProps = {
  readonly title: string;
  /** What is safe and what to do. */
  readonly sentence: ReactNode;
  /** The machine's own words, for whoever is asked for help. */
  readonly detail?: string;
  readonly action?: ReactNode;
};

/** Something did not work: said at once to screen readers, with what to do. */
export function ErrorState({ title, sentence, detail, action }: ErrorStateProps) {
  return (
    <div className="hm-state hm-state-error" role="alert">
      <h2>{title}</h2>
      <p>{sentence}</p>
      {detail ? <p className="hm-state-detail">{detail}</p> : null}
      {action ? <div className="hm-state-action">{action}</div> : null}
    </div>
  );
}
