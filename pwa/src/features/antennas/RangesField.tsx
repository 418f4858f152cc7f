import type { Receiver } from '@harkmoor/sync-model/records/receiver';
import { Button } from '../../design/button/Button';
import { NumberField } from '../../design/form/NumberField';
import type { FormErrors } from '../../design/form/use-form-errors';
import './antennas.css';

type Range = Receiver['ranges'][number];

type RangesFieldProps = {
  readonly errors: FormErrors;
  readonly ranges: readonly Range[];
  readonly onChange: (ranges: Range[]) => void;
};

const RANGES_MAX = 10;

/** What a receiver covers, in kHz as its dial says. */
export function RangesField({ errors, ranges, onChange }: RangesFieldProps) {
  const set = (at: number, change: Partial<Range>) =>
    onChange(ranges.map((range, i) => (i === at ? { ...range, ...change } : range)));
  return (
    <fieldset className="gear-ranges">
      <legend className="hm-label">Covers</legend>
      {ranges.map((range, at) => (
        <div key={at} className="gear-range">
          <NumberField
            {...errors.field(`ranges.${at}.lowHz`)}
            label="From"
            unit="kHz"
            required
            value={range.lowHz / 1000}
            onChange={(khz) => set(at, { lowHz: toHz(khz) })}
          />
          <NumberField
            {...errors.field(`ranges.${at}.highHz`)}
            error={errors.field(`ranges.${at}.highHz`).error ?? errors.field(`ranges.${at}`).error}
            label="To"
            unit="kHz"
            required
            value={range.highHz / 1000}
            onChange={(khz) => set(at, { highHz: toHz(khz) })}
          />
          <Button
            look="quiet"
            aria-label={`Remove range ${at + 1}`}
            onClick={() => onChange(ranges.filter((_, i) => i !== at))}
          >
            Remove
          </Button>
        </div>
      ))}
      {ranges.length < RANGES_MAX ? (
        <Button
          look="outline"
          onClick={() => onChange([...ranges, { lowHz: 87_500_000, highHz: 108_000_000 }])}
        >
          Add a range
        </Button>
      ) : null}
    </fieldset>
  );
}

/** An empty figure becomes no number, which the schema refuses by name. */
function toHz(khz: number | null): number {
  return khz === null ? Number.NaN : Math.round(khz * 1000);
}
