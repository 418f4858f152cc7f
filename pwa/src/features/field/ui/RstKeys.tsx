import { formatRst, RST_NAMES, rstMeaning, type RstLetter } from '@harkmoor/sync-model/radio/signal/rst';
import type { Rst } from '@harkmoor/sync-model/records/reception';
import { ChoiceChips } from '../../../design/choice/ChoiceChips';

type RstKeysProps = {
  readonly rst: Rst | null;
  /** The tone is judged in telegraphy only. */
  readonly hasTone: boolean;
  readonly onRst: (rst: Rst | null) => void;
};

const FIRST: Rst = { r: 5, s: 9 };

/** Readability, strength and, for telegraphy, tone; a second tap on a chosen key takes the whole report back. */
export function RstKeys({ rst, hasTone, onRst }: RstKeysProps) {
  const letters: [RstLetter, number][] = [
    ['r', 5],
    ['s', 9],
    ...(hasTone ? ([['t', 9]] as [RstLetter, number][]) : []),
  ];
  const choose = (letter: RstLetter, text: string | null): void => {
    if (text === null) return onRst(null);
    const begun = rst ?? (hasTone ? { ...FIRST, t: 9 } : FIRST);
    const { t, ...voice } = { ...begun, [letter]: Number(text) };
    onRst(hasTone ? { ...voice, t: t ?? 9 } : voice);
  };
  return (
    <section aria-label="RST">
      {letters.map(([letter, top]) => (
        <ChoiceChips
          key={letter}
          label={`${RST_NAMES[letter]}${rst?.[letter] ? `: ${rstMeaning(letter, rst[letter])}` : ''}`}
          oneLine
          clearable
          options={Array.from({ length: top }, (_, index) => ({
            value: String(index + 1),
            label: String(index + 1),
          }))}
          value={rst?.[letter] ? String(rst[letter]) : null}
          onChange={(value) => choose(letter, value)}
        />
      ))}
      <p className="num" role="status">
        {rst ? `RST ${formatRst(rst)}` : 'No RST given'}
      </p>
    </section>
  );
}
