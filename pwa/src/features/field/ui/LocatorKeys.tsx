import { locatorSigns, typedLocator } from '../locator-signs';
import './locator-keys.css';

type LocatorKeysProps = { readonly text: string; readonly onText: (text: string) => void };

/** Our own keys for a locator: at each place only the signs that may stand there, so a glove cannot type a wrong one. */
export function LocatorKeys({ text, onText }: LocatorKeysProps) {
  const signs = locatorSigns(text);
  return (
    <div className="fd-locator">
      <div className="fd-locator-field">
        <label>
          <span className="only-heard">Locator</span>
          <input
            className="num"
            inputMode="none"
            autoComplete="off"
            spellCheck={false}
            placeholder="Locator"
            value={text}
            onChange={(event) => onText(typedLocator(event.target.value))}
          />
        </label>
        <button
          type="button"
          aria-label="Take back the last sign"
          disabled={text === ''}
          onClick={() => onText(text.slice(0, -1))}
        >
          ⌫
        </button>
      </div>
      <div className="fd-locator-keys num" data-count={signs.length}>
        {signs.map((sign) => (
          <button key={sign} type="button" aria-label={sign} onClick={() => onText(text + sign)}>
            {sign}
          </button>
        ))}
      </div>
    </div>
  );
}
