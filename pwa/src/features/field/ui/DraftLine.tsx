import type { PadDraft } from '../data/pad-drafts';
import './draft-line.css';

type DraftLineProps = {
  readonly draft: PadDraft;
  readonly onContinue: () => void;
  readonly onDrop: () => void;
};

/** A pad that was left before *Save*: it counts nowhere until it is saved. */
export function DraftLine({ draft, onContinue, onDrop }: DraftLineProps) {
  return (
    <div className="hm-notice fd-draft" role="group" aria-label="Not saved yet">
      <span className="hm-notice-text num">Not saved: {draft.values.title}</span>
      <button type="button" onClick={onContinue}>
        Continue
      </button>
      <button type="button" className="hm-notice-dismiss" onClick={onDrop}>
        Discard
      </button>
    </div>
  );
}
