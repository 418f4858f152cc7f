import { frequencyText } from '@harkmoor/sync-model/radio/bands/frequency-text';
import { formatMeter } from '@harkmoor/sync-model/radio/signal/meter';
import type { ReactNode } from 'react';
import { Section } from '../../../design/layout/Section';
import { utcDate, utcTime, withUnit } from '../../../platform/utc-text';
import type { HeldReception } from '../data/held-reception';
import type { Derived } from './derive';
import { frequencyBasisWords, levelBasisWords, timeBasisWords } from './reading-words';

type ReadingSectionProps = { readonly held: HeldReception; readonly derived: Derived };

/** Each raw reading with the value that follows from it beside it, and under both on what that rests. */
export function ReadingSection({ held, derived }: ReadingSectionProps) {
  const { fields } = held.record;
  const { time, frequency } = derived;
  const isSameDay = utcDate(fields.deviceAt) === utcDate(time.atMs);
  return (
    <Section title="Readings">
      <table className="log-readings">
        <caption className="only-heard">Raw readings and what follows from them</caption>
        <thead>
          <tr>
            <td />
            <th scope="col">As read</th>
            <th scope="col">Corrected</th>
          </tr>
        </thead>
        <tbody>
          <Reading
            name="Time, UTC"
            raw={utcTime(fields.deviceAt)}
            derived={isSameDay ? utcTime(time.atMs) : `${utcTime(time.atMs)}, ${utcDate(time.atMs)}`}
            basis={timeBasisWords(time)}
          />
          <Reading
            name="Dial"
            raw={frequencyText(fields.tuning.dialHz)}
            derived={frequencyText(frequency.frequencyHz)}
            basis={frequencyBasisWords(frequency)}
          />
          <LevelReadings held={held} derived={derived} />
        </tbody>
      </table>
    </Section>
  );
}

function LevelReadings({ held, derived }: ReadingSectionProps) {
  const { meter, noiseMeter, carried } = held.record.fields;
  const scale = held.receiver?.meterScale ?? null;
  const over =
    derived.signalDbm !== null && derived.noiseDbm !== null ? derived.signalDbm - derived.noiseDbm : null;
  const untouched = 'Taken over from the entry before and not touched: no reading of this one.';
  if (!meter && !noiseMeter) return <Reading name="Meter" raw="not read" derived="–" basis={null} />;
  return (
    <>
      <Reading
        name="Meter"
        raw={meter ? formatMeter(meter) : 'not read'}
        derived={levelText(derived.signalDbm)}
        basis={carried?.includes('meter') ? untouched : meter ? levelBasisWords(scale) : null}
      />
      <Reading
        name="Noise"
        raw={noiseMeter ? formatMeter(noiseMeter) : 'not read'}
        derived={levelText(derived.noiseDbm)}
        basis={
          carried?.includes('noiseMeter')
            ? untouched
            : over === null
              ? null
              : `The signal stood ${withUnit(over, 'dB', 1)} over the noise beside it.`
        }
      />
    </>
  );
}

function levelText(dbm: number | null): string {
  return dbm === null ? '–' : withUnit(dbm, 'dBm', Number.isInteger(dbm) ? 0 : 1);
}

type ReadingProps = {
  readonly name: string;
  readonly raw: ReactNode;
  readonly derived: ReactNode;
  readonly basis: string | null;
};

function Reading({ name, raw, derived, basis }: ReadingProps) {
  return (
    <>
      <tr className={basis ? 'log-reading-based' : undefined}>
        <th scope="row">{name}</th>
        <td className="num">{raw}</td>
        <td className="num">{derived}</td>
      </tr>
      {basis ? (
        <tr className="log-reading-basis">
          <td colSpan={3} className="num">
            {basis}
          </td>
        </tr>
      ) : null}
    </>
  );
}
