import type { MeterReading } from '@harkmoor/sync-model/records/common-fields';
import { formatMeter } from '@harkmoor/sync-model/radio/signal/meter';
import { keysOf, nudged, sameReading, type MeterKind } from './meter-steps';
import './meter-keys.css';

export type MeterSubject = 'signal' | 'noise';

type MeterKeysProps = {
  readonly kind: MeterKind;
  readonly signal: MeterReading | null;
  readonly noise: MeterReading | null;
  /** Readings of the entry before, shown as outlines while nothing was touched. */
  readonly outlined?: { readonly signal: MeterReading | null; readonly noise: MeterReading | null };
  /** What the keys read just now. */
  readonly subject: MeterSubject;
  readonly onSubject: (subject: MeterSubject) => void;
  /** Null: not read. */
  readonly onReading: (subject: MeterSubject, reading: MeterReading | null) => void;
  /** The level behind an S reading, "−85 dBm". */
  readonly levelText?: string | null;
};

/** The meter as keys: the signal and the noise beside it share one set. Not read unless a key was tapped. */
export function MeterKeys(props: MeterKeysProps) {
  const { kind, subject, onReading } = props;
  const reading = props[subject];
  const outlined = reading === null ? (props.outlined?.[subject] ?? null) : null;
  const nudge = (step: -1 | 1): void => onReading(subject, nudged(reading, kind, step));
  return (
    <section className="hm-meter" aria-label="Meter">
      <div className="hm-meter-head">
        <SubjectKey {...props} of="signal" words="Signal" />
        <SubjectKey {...props} of="noise" words="Noise beside it" />
        <div className="hm-meter-fine">
          <button
            type="button"
            aria-label="Finer, down"
            disabled={reading === null}
            onClick={() => nudge(-1)}
          >
            −
          </button>
          <button type="button" aria-label="Finer, up" disabled={reading === null} onClick={() => nudge(1)}>
            +
          </button>
        </div>
      </div>
      <div
        className="hm-meter-keys"
        role="radiogroup"
        aria-label={subject === 'signal' ? 'Signal' : 'Noise beside it'}
      >
        {keysOf(kind).map((key) => {
          const isChosen = reading !== null && sameReading(reading, key.reading);
          const isOutlined = outlined !== null && sameReading(outlined, key.reading);
          return (
            <button
              key={key.label}
              type="button"
              role="radio"
              aria-checked={isChosen}
              aria-label={key.spoken}
              className={isChosen ? 'hm-meter-chosen' : isOutlined ? 'hm-meter-outlined' : undefined}
              onClick={() => onReading(subject, isChosen ? null : key.reading)}
            >
              {key.label}
            </button>
          );
        })}
      </div>
    </section>
  );
}

function SubjectKey(props: MeterKeysProps & { readonly of: MeterSubject; readonly words: string }) {
  const { of, words } = props;
  const reading = props[of];
  const level =
    of === 'signal' && reading && !('dbm' in reading) && props.levelText ? ` · ${props.levelText}` : '';
  return (
    <button
      type="button"
      className="hm-meter-subject"
      aria-pressed={props.subject === of}
      onClick={() => props.onSubject(of)}
    >
      <span>{words}</span>
      <b className="num">{reading ? formatMeter(reading) + level : 'not read'}</b>
    </button>
  );
}
