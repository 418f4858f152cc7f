import { formatRst, RST_NAMES, rstMeaning, type RstLetter } from '@harkmoor/sync-model/radio/signal/rst';
import type { Rst } from '@harkmoor/sync-model/records/reception';
import { ChoiceChips } from '../../../design/choice/ChoiceChips';
import { rstOf, type RstParts } from '../rst-parts';

type RstKeysProps = {
  readonly parts: RstParts;
  /** The report of the entry before, which counts only once it is touched. */
  readonly outlined: Rst | null;
  /** The tone is judged in telegraphy only. */
  readonly hasTone: boolean;
  readonly onParts: (parts: RstParts) => void;
};

const TOPS: Readonly<Record<RstLetter, number>> = { r: 5, s: 9, t: 9 };

/** Readability, strength and, for telegraphy, tone; a second tap on a chosen key takes that figure back. */
export function RstKeys({ parts, outlined, hasTone, onParts }: RstKeysProps) {
  const letters: readonly RstLetter[] = hasTone ? ['r', 's', 't'] : ['r', 's'];
  const choose = (letter: RstLetter, text: string | null): void => {
    const { [letter]: _before, ...others } = parts;
    onParts(text === null ? others : { ...others, [letter]: Number(text) });
  };
  return (
    <section aria-label="RST">
      {letters.map((letter) => {
        const figure = parts[letter];
        const name = RST_NAMES[letter];
        return (
          <ChoiceChips
            key={letter}
            label={`${name.charAt(0).toUpperCase()}${name.slice(1)}${figure ? `: ${rstMeaning(letter, figure)}` : ''}`}
            clearable
            options={Array.from({ length: TOPS[letter] }, (_, index) => ({
              value: String(index + 1),
              label: String(index + 1),
            }))}
            value={figure ? String(figure) : null}
            onChange={(value) => choose(letter, value)}
          />
        );
      })}
      <p className="num" role="status">
        {reportWords()}
      </p>
    </section>
  );

  function reportWords(): string {
    const rst = rstOf(parts, hasTone);
    if (rst) return `RST ${formatRst(rst)}`;
    if (parts.r !== undefined) return 'Now strength: without it the report does not count.';
    if (Object.keys(parts).length > 0) return 'Now readability: without it the report does not count.';
    return outlined
      ? `The entry before: ${formatRst(outlined)}. Only what you touch counts.`
      : 'No RST given';
  }
}
