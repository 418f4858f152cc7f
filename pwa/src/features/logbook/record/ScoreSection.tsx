import { formatRst, RST_NAMES, rstMeaning, type RstLetter } from '@harkmoor/sync-model/radio/signal/rst';
import {
  formatSinpo,
  SINPO_LETTERS,
  SINPO_MEANINGS,
  sinpoHint,
  type SinpoLetter,
} from '@harkmoor/sync-model/radio/signal/sinpo';
import type { Reception, Rst, Sinpo } from '@harkmoor/sync-model/records/reception';
import { Section } from '../../../design/layout/Section';
import { utcTime } from '../../../platform/utc-text';
import { NIL_REASON_WORDS } from './reading-words';

/** What was heard: the score grade by grade with its meaning, or the nil with its reason, and what was said. */
export function ScoreSection({ fields }: { readonly fields: Reception }) {
  const { outcome, nilReason, sinpo, rst, carried, programme, remarks } = fields;
  return (
    <Section title={outcome === 'heard' ? 'Heard' : outcome === 'nil' ? 'Nil' : 'Skipped'}>
      {outcome === 'nil' ? (
        <p>{nilReason ? NIL_REASON_WORDS[nilReason] : 'Not heard, no reason given'}.</p>
      ) : null}
      {outcome === 'skipped' ? <p>Nobody listened: it counts nowhere.</p> : null}
      {outcome === 'heard' && !sinpo && !rst ? <p>Not scored.</p> : null}
      {sinpo ? <SinpoWords sinpo={sinpo} isCarried={carried?.includes('sinpo') ?? false} /> : null}
      {rst ? <RstWords rst={rst} isCarried={carried?.includes('rst') ?? false} /> : null}
      {programme && programme.length > 0 ? (
        <>
          <h3 className="log-small-head">Programme</h3>
          <ol className="log-programme">
            {programme.map(({ at, text }) => (
              <li key={`${at}/${text}`}>
                <span className="num soft">{utcTime(at)} UTC</span> {text}
              </li>
            ))}
          </ol>
        </>
      ) : null}
      {remarks ? (
        <>
          <h3 className="log-small-head">Remarks</h3>
          <p className="log-remarks">{remarks}</p>
        </>
      ) : null}
    </Section>
  );
}

const UNTOUCHED = 'Taken over from the entry before and not touched: it does not count.';

function SinpoWords({ sinpo, isCarried }: { readonly sinpo: Sinpo; readonly isCarried: boolean }) {
  const hint = sinpoHint(sinpo);
  return (
    <>
      <p className="log-score num">
        {formatSinpo(sinpo)} <small>SINPO</small>
      </p>
      {isCarried ? <p className="soft small">{UNTOUCHED}</p> : null}
      <ul className="log-grades">
        {SINPO_LETTERS.map((letter: SinpoLetter) => (
          <li key={letter}>
            <b className="num">
              {letter.toUpperCase()} {sinpo[letter]}
            </b>{' '}
            {SINPO_MEANINGS[letter][sinpo[letter]]}
          </li>
        ))}
      </ul>
      {hint ? <p className="soft small">{hint}</p> : null}
    </>
  );
}

function RstWords({ rst, isCarried }: { readonly rst: Rst; readonly isCarried: boolean }) {
  const letters: readonly RstLetter[] = rst.t === undefined ? ['r', 's'] : ['r', 's', 't'];
  return (
    <>
      <p className="log-score num">
        {formatRst(rst)} <small>RST</small>
      </p>
      {isCarried ? <p className="soft small">{UNTOUCHED}</p> : null}
      <ul className="log-grades">
        {letters.map((letter) => (
          <li key={letter}>
            <b className="num">
              {letter.toUpperCase()} {rst[letter]}
            </b>{' '}
            {RST_NAMES[letter]}: {rstMeaning(letter, rst[letter] ?? 0)}
          </li>
        ))}
      </ul>
    </>
  );
}
