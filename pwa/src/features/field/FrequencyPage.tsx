import { FrequencyKeys } from '../../design/frequency-keys/FrequencyKeys';
import { ButtonLink } from '../../design/button/ButtonLink';
import { EmptyState } from '../../design/states/EmptyState';
import { useHand } from '../../platform/hand';
import { paths } from '../../platform/paths';
import { useOwnOutings, type StoredOuting } from './data/running-outing';
import { FieldFrame, InFoot } from './ui/FieldFrame';
import { LockKey } from './ui/LockKey';
import { ModeChips } from './ui/ModeChips';
import { RainLock, useRainLock } from './ui/RainLock';
import type { FrequencyEntry } from './use-frequency-entry';
import { useFrequencyAnswers } from './use-frequency-answers';
import './ui/frequency-entry.css';
import './ui/target-row.css';

/** Frequency entry: our own keys; a planned try is heard or nil, a signal that was simply met is by chance. */
export function FrequencyPage() {
  const outings = useOwnOutings();
  const rain = useRainLock();
  return (
    <FieldFrame
      title="Other frequency"
      back={{ to: paths.field(), label: 'Field' }}
      actions={<LockKey onLock={rain.lock} />}
    >
      {rain.isLocked ? <RainLock onOpen={rain.unlock} /> : null}
      {outings === undefined ? null : outings.running ? (
        <Entry key={outings.running.id} outing={outings.running} />
      ) : (
        <EmptyState
          title="No outing runs"
          sentence="An entry belongs to an outing: start one, then enter the frequency."
          action={<ButtonLink to={paths.field()}>To Field</ButtonLink>}
        />
      )}
    </FieldFrame>
  );
}

function Entry({ outing }: { readonly outing: StoredOuting }) {
  const { entry, target, openPad, logNil } = useFrequencyAnswers(outing);
  const hand = useHand();
  const isReady = entry.frequencyHz !== null;
  const spoken = entry.words.replace(/\s·\s/g, ', ');
  return (
    <div className="fd" data-hand={hand}>
      <FrequencyKeys
        text={entry.text}
        onText={entry.setText}
        reading={
          <span className={entry.isWrong ? 'fd-wrong num' : 'num'}>
            {entry.words}
            {target ? ` · ${target.fields.name}` : ''}
          </span>
        }
        offers={<Offers entry={entry} />}
        onEnter={() => openPad('planned')}
      />
      <ModeChips mode={entry.mode} onMode={entry.setMode} />
      <p className="soft small">
        Nil and Heard: you chose this frequency before you listened. By chance: you simply met the signal; it
        gives scores, and counts in no rate.
      </p>
      <InFoot>
        <div className="fd-entry-foot" data-hand={hand}>
          <button
            type="button"
            className="fd-chance"
            disabled={!isReady}
            onClick={() => openPad('chance')}
            aria-label={`By chance, ${spoken}`}
          >
            By chance
          </button>
          <div className="fd-answers">
            <button
              type="button"
              className="fd-nil"
              disabled={!isReady}
              onClick={logNil}
              aria-label={`Nil, ${spoken}`}
            >
              Nil
            </button>
            <button
              type="button"
              className="fd-heard"
              disabled={!isReady}
              onClick={() => openPad('planned')}
              aria-label={`Heard, ${spoken}`}
            >
              Heard
            </button>
          </div>
        </div>
      </InFoot>
    </div>
  );
}

function Offers({ entry }: { readonly entry: FrequencyEntry }) {
  return entry.offers.map((offer) => (
    <button
      key={offer.label}
      type="button"
      className="fd-offer num"
      onClick={() => entry.setText(offer.text)}
    >
      {offer.label}
    </button>
  ));
}
