import { useId } from 'react';
import { figureText } from '../../../platform/utc-text';

export type Choice<V> = {
  readonly key: string;
  readonly label: string;
  /** Observations behind it; left out where it says nothing. */
  readonly n?: number;
  readonly value: V;
};

type OptionListProps<V> = {
  readonly legend: string;
  readonly hideLegend?: boolean;
  readonly name: string;
  readonly choices: readonly Choice<V>[];
  readonly chosen: string;
  readonly onChoose: (value: V) => void;
};

/** One of many, a line each, with its number of observations: radio buttons under the lines. */
export function OptionList<V>({ legend, hideLegend, name, choices, chosen, onChoose }: OptionListProps<V>) {
  const id = useId();
  return (
    <fieldset className="cov-options">
      <legend className={hideLegend ? 'only-heard' : undefined}>{legend}</legend>
      {choices.map(({ key, label, n, value }) => (
        <label key={key} className="cov-option num">
          <input
            type="radio"
            name={`${id}-${name}`}
            checked={chosen === key}
            onChange={() => onChoose(value)}
          />
          <span>{label}</span>
          {n === undefined ? null : <small>{figureText(n)} obs.</small>}
        </label>
      ))}
    </fieldset>
  );
}
