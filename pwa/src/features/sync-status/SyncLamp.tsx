import { Link } from 'react-router-dom';
import { paths } from '../../platform/paths';
import { useSendingState, type SendingState } from './data/use-sending-state';
import { lampOf, type LampInput } from './lamp-words';
import './sync-status.css';

/** The state of sending, as a mark whose shape tells it, and a line; leads to the page of what waits. */
export function SyncLamp() {
  const state = useSendingState();
  const lamp = lampOf(lampInput(state), Date.now());
  return (
    <Link to={paths.sync()} className={`lamp lamp-${lamp.look}`}>
      <span className="lamp-mark" aria-hidden="true" />
      <span className="num">{lamp.text}</span>
    </Link>
  );
}

export function lampInput(state: SendingState): LampInput {
  if (state.kind !== 'account') return state;
  const { waiting, refused, completeAt, status } = state;
  return {
    kind: 'account',
    waiting,
    refused,
    completeAt,
    pause: status.pause,
    isRunning: status.isRunning,
    lastContactAt: status.lastContactAt,
  };
}
