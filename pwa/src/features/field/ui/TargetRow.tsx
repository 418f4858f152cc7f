import { memo } from 'react';
import type { OnAirState } from '@harkmoor/sync-model/evidence/schedule';
import { formatFrequency } from '@harkmoor/sync-model/radio/bands/frequency-text';
import type { RoundRow } from '@harkmoor/sync-model/records/round';
import { utcHourMinute } from '../../../platform/utc-text';
import type { StoredReception } from '../data/outing-entries';
import type { StoredTarget } from '../data/outing-frame';
import { useLongPress } from '../use-long-press';
import { offAirWords, onAirWords, outcomeWords, spokenFrequency } from '../words';
import './target-row.css';

export type RowActs = {
  readonly onHeard: (target: StoredTarget, atMs: number) => void;
  readonly onNil: (target: StoredTarget, atMs: number) => void;
  readonly onNilReason: (target: StoredTarget, atMs: number) => void;
  readonly onTryAnyway: (target: StoredTarget) => void;
  readonly onMore: (target: StoredTarget) => void;
  readonly onEdit: (entry: StoredReception) => void;
};

type TargetRowProps = {
  readonly row: RoundRow<StoredTarget, StoredReception>;
  readonly onAir: OnAirState;
  /** Offered although it should be silent. */
  readonly isTriedAnyway: boolean;
  /** "862 km · 98°"; empty where the transmitter is not known. */
  readonly path: string;
  readonly setupLabel: string;
  readonly nowMs: number;
  readonly acts: RowActs;
};

/** One line of the round, 96 px high: what to listen for, and its two answers or the one given. */
export const TargetRow = memo(function TargetRow(props: TargetRowProps) {
  const { row, onAir, path, acts, nowMs } = props;
  const { target, entry } = row;
  const { frequencyHz, name } = target.fields;
  const { figure, unit } = formatFrequency(frequencyHz);
  const spoken = `${spokenFrequency(frequencyHz)}, ${name}`;
  const state =
    onAir.kind === 'on' ? onAirWords(onAir) : props.isTriedAnyway ? offAirWords(onAir, nowMs) : '';
  const detail = [path, entry ? '' : state].filter(Boolean).join(' · ');
  return (
    <li
      className={row.isNext ? 'fd-row fd-row-next' : 'fd-row'}
      aria-current={row.isNext ? 'step' : undefined}
    >
      <button type="button" className="fd-what" onClick={() => acts.onMore(target)}>
        <span className="fd-frequency num">
          {figure} <small>{unit}</small>
        </span>
        <span className="fd-name">{name}</span>
        {detail ? <span className="fd-detail num">{detail}</span> : null}
        <span className="only-heard">More</span>
      </button>
      <Answers {...props} spoken={spoken} />
    </li>
  );
});

function Answers(props: TargetRowProps & { readonly spoken: string }) {
  const { row, onAir, isTriedAnyway, acts, spoken, nowMs } = props;
  if (row.entry) return <DoneAnswer {...props} entry={row.entry} />;
  if (onAir.kind === 'off' && !isTriedAnyway) {
    return (
      <div className="fd-off">
        {offAirWords(onAir, nowMs)}
        <button
          type="button"
          aria-label={`Try anyway, ${spoken}`}
          onClick={() => acts.onTryAnyway(row.target)}
        >
          Try anyway
        </button>
      </div>
    );
  }
  return (
    <div className="fd-answers">
      <NilKey target={row.target} spoken={spoken} acts={acts} />
      <button
        type="button"
        className="fd-heard"
        aria-label={`Heard, ${spoken}`}
        onClick={() => acts.onHeard(row.target, Date.now())}
      >
        Heard
      </button>
    </div>
  );
}

function NilKey({ target, spoken, acts }: { target: StoredTarget; spoken: string; acts: RowActs }) {
  const press = useLongPress({
    onTap: (atMs) => acts.onNil(target, atMs),
    onLongPress: (atMs) => acts.onNilReason(target, atMs),
  });
  return (
    <button type="button" className="fd-nil" aria-label={`Nil, ${spoken}`} {...press}>
      Nil
    </button>
  );
}

function DoneAnswer(props: TargetRowProps & { readonly spoken: string; readonly entry: StoredReception }) {
  const { entry, setupLabel, spoken, acts } = props;
  const words = outcomeWords(entry.fields);
  const time = utcHourMinute(entry.fields.deviceAt);
  return (
    <button type="button" className="fd-done num" onClick={() => acts.onEdit(entry)}>
      <b>{words}</b>
      <small>
        {setupLabel} · {time}
        <span className="only-heard"> UTC, {spoken}. Edit</span>
      </small>
    </button>
  );
}
