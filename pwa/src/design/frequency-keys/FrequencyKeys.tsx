import { useEffect, useRef, type KeyboardEvent, type ReactNode } from 'react';
import './frequency-keys.css';

type FrequencyKeysProps = {
  /** As typed: "6070", "9.5M", "49m". */
  readonly text: string;
  readonly onText: (text: string) => void;
  /** The reading with its band and service, or what is wrong; said above the keys. */
  readonly reading: ReactNode;
  /** Ways to mean it otherwise: MHz, a metre band. Below the keys, which must not move while they are tapped. */
  readonly offers?: ReactNode;
  /** The Enter key of a keyboard. */
  readonly onEnter?: () => void;
};

type Key = { readonly label: string; readonly spoken: string; readonly insert?: string };

const KEYS: readonly Key[] = [
  { label: '1', spoken: '1', insert: '1' },
  { label: '2', spoken: '2', insert: '2' },
  { label: '3', spoken: '3', insert: '3' },
  { label: 'MHz', spoken: 'MHz', insert: 'M' },
  { label: '4', spoken: '4', insert: '4' },
  { label: '5', spoken: '5', insert: '5' },
  { label: '6', spoken: '6', insert: '6' },
  { label: 'kHz', spoken: 'kHz', insert: 'k' },
  { label: '7', spoken: '7', insert: '7' },
  { label: '8', spoken: '8', insert: '8' },
  { label: '9', spoken: '9', insert: '9' },
  { label: 'm band', spoken: 'm band', insert: 'm' },
  { label: '.', spoken: 'decimal point', insert: '.' },
  { label: '0', spoken: '0', insert: '0' },
  { label: '⌫', spoken: 'Take back the last figure' },
  { label: 'Clear', spoken: 'Clear' },
];
const LENGTH_MAX = 14;

/**
 * Our own keys for a frequency: no system keyboard rises, and gloves find them. The field is a real one, so a
 * keyboard, a paste and a screen reader work as everywhere.
 */
export function FrequencyKeys({ text, onText, reading, offers, onEnter }: FrequencyKeysProps) {
  const field = useRef<HTMLInputElement>(null);
  useEffect(() => field.current?.focus({ preventScroll: true }), []);
  const press = (key: Key): void => {
    if (key.insert !== undefined) onText(appended(text, key.insert));
    else onText(key.label === 'Clear' ? '' : text.slice(0, -1));
  };
  const enter = (event: KeyboardEvent): void => {
    if (event.key !== 'Enter' || !onEnter) return;
    event.preventDefault();
    onEnter();
  };
  return (
    <div className="hm-freq">
      <label className="hm-freq-field">
        <span className="only-heard">Frequency in kHz, or with M for MHz</span>
        <input
          ref={field}
          className="num"
          inputMode="none"
          autoComplete="off"
          autoCapitalize="none"
          spellCheck={false}
          maxLength={LENGTH_MAX}
          placeholder="kHz"
          value={text}
          onChange={(event) => onText(event.target.value)}
          onKeyDown={enter}
        />
      </label>
      <div className="hm-freq-reading" role="status">
        {reading}
      </div>
      <div className="hm-freq-keys">
        {KEYS.map((key) => (
          <button
            key={key.label}
            type="button"
            aria-label={key.spoken}
            className={key.insert && /\d|\./.test(key.insert) ? 'num' : 'hm-freq-word'}
            onClick={() => press(key)}
          >
            {key.label}
          </button>
        ))}
      </div>
      {offers ? <div className="hm-freq-offers">{offers}</div> : null}
    </div>
  );
}

/** A unit replaces the unit before it: who taps MHz after kHz means MHz. */
function appended(text: string, insert: string): string {
  const isUnit = /[a-zA-Z]/.test(insert);
  const figures = text.replace(/[a-zA-Z\s]+$/, '');
  return (isUnit ? figures + insert : figures === text ? text + insert : insert).slice(0, LENGTH_MAX);
}
