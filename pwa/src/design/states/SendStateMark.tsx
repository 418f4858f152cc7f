import type { SendState } from '@harkmoor/sync-model/device/stored-record';
import './send-state.css';

/** `verified` is known only where digests are compared. */
export type ShownSendState = SendState | 'verified';

export const SEND_STATE_WORDS: Readonly<Record<ShownSendState, string>> = {
  'only-here': 'Only here',
  sending: 'Sending',
  sent: 'Sent',
  verified: 'Verified',
  'needs-attention': 'Needs attention',
};

type SendStateMarkProps = {
  readonly state: ShownSendState;
  /** In place of the state's own word: "7 only here · last contact 14:05". */
  readonly words?: string;
};

/** Where a record is, as a shape and a word: the shapes differ, the colour only helps. */
export function SendStateMark({ state, words }: SendStateMarkProps) {
  return (
    <span className={`hm-send-state hm-send-state-${state}`}>
      <SendStateShape state={state} />
      <span>{words ?? SEND_STATE_WORDS[state]}</span>
    </span>
  );
}

function SendStateShape({ state }: { readonly state: ShownSendState }) {
  return (
    <svg
      width="14"
      height="14"
      viewBox="0 0 14 14"
      fill="none"
      stroke="currentColor"
      strokeWidth="2"
      aria-hidden="true"
    >
      {state === 'only-here' ? <path d="M7 1.6 12.4 7 7 12.4 1.6 7Z" /> : null}
      {state === 'sending' ? <path d="M7 13V2M2.5 6.5 7 2l4.5 4.5" /> : null}
      {state === 'sent' ? <path d="M7 1.6 12.4 7 7 12.4 1.6 7Z" fill="currentColor" /> : null}
      {state === 'verified' ? <path d="M1.5 7.5 5.5 11.5 12.5 2.5" strokeWidth="2.6" /> : null}
      {state === 'needs-attention' ? <path d="M7 1v7.5M7 10.5V13" strokeWidth="3" /> : null}
    </svg>
  );
}
