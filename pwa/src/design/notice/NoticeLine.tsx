import type { ReactNode } from 'react';
import './notice.css';

type NoticeLineProps = {
  /** Null while there is nothing to say: the live region stays, so that the next line is read out. */
  readonly text: ReactNode | null;
  readonly actionLabel?: string;
  readonly onAction?: () => void;
  readonly onDismiss?: () => void;
};

/** One line about what just happened, with its undo. Read out politely, without taking the focus. */
export function NoticeLine({ text, actionLabel, onAction, onDismiss }: NoticeLineProps) {
  return (
    <div role="status" className="hm-notice-place">
      {text === null ? null : (
        <div className="hm-notice">
          <span className="hm-notice-text">{text}</span>
          {actionLabel && onAction ? (
            <button type="button" onClick={onAction}>
              {actionLabel}
            </button>
          ) : null}
          {onDismiss ? (
            <button type="button" className="hm-notice-dismiss" onClick={onDismiss}>
              Later
            </button>
          ) : null}
        </div>
      )}
    </div>
  );
}
