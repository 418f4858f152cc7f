import { useIonRouter } from '@ionic/react';
import { onAirState } from '@harkmoor/sync-model/evidence/schedule';
import { FrequencyKeys } from '../../design/frequency-keys/FrequencyKeys';
import { ButtonLink } from '../../design/button/ButtonLink';
import { EmptyState } from '../../design/states/EmptyState';
import { PageFrame } from '../../design/page/PageFrame';
import { useHand } from '../../platform/hand';
import { paths } from '../../platform/paths';
import { buzz } from '../../platform/vibrate';
import { useClub } from './data/club';
import { useOutingFrame, type StoredTarget } from './data/outing-frame';
import { useOwnOutings, type StoredOuting } from './data/running-outing';
import { useFieldActions } from './data/use-field-actions';
import { padForFrequency } from './pad-paths';
import { ModeChips } from './ui/ModeChips';
import { useAct } from './use-act';
import { useFrequencyEntry } from './use-frequency-entry';
import { useGoToField } from './use-go-to-field';
import './ui/field.css';

/** Frequency entry: our own keys; a planned try is heard or nil, a signal that was simply met is by chance. */
export function FrequencyPage() {
  const outings = useOwnOutings();
  if (outings === undefined) return <Frame>{null}</Frame>;
  if (!outings.running) {
    return (
      <Frame>
        <EmptyState
          title="No outing runs"
          sentence="An entry belongs to an outing: start one, then enter the frequency."
          action={<ButtonLink to={paths.field()}>To Field</ButtonLink>}
        />
      </Frame>
    );
  }
  return <Entry outing={outings.running} />;
}

function Entry({ outing }: { readonly outing: StoredOuting }) {
  const { ituRegion } = useClub();
  const entry = useFrequencyEntry(ituRegion);
  const frame = useOutingFrame(outing);
  const router = useIonRouter();
  const goToField = useGoToField();
  const actions = useFieldActions();
  const act = useAct();
  const hand = useHand();
  const { frequencyHz, mode } = entry;
  const target = targetOn(frequencyHz, frame?.targets ?? []);
  const canAnswer = frequencyHz !== null;

  const openPad = (means: 'planned' | 'chance'): void => {
    if (frequencyHz === null) return;
    buzz();
    const entered = { dialHz: frequencyHz, mode, means, targetId: target?.id ?? null };
    router.push(padForFrequency(entered, Date.now(), actions.newId()), 'forward', 'replace');
  };
  const logNil = async (): Promise<void> => {
    if (frequencyHz === null) return;
    buzz();
    const deviceAtMs = Date.now();
    const subject = {
      kind: 'frequency' as const,
      dialHz: frequencyHz,
      mode,
      basis: 'planned' as const,
      ...(target ? { target: { id: target.id, fields: target.fields } } : {}),
    };
    const tap = { outcome: 'nil' as const, subject, outingId: outing.id, outing: outing.fields, deviceAtMs };
    if (await act(() => actions.logTap(tap))) goToField();
  };
  const spoken = entry.words.replace(/\s·\s/g, ', ');
  return (
    <Frame
      foot={
        <div className="fd fd-entry-foot" data-hand={hand}>
          <button
            type="button"
            className="fd-chance"
            disabled={!canAnswer}
            onClick={() => openPad('chance')}
            aria-label={`By chance, ${spoken}`}
          >
            By chance
          </button>
          <div className="fd-answers">
            <button
              type="button"
              className="fd-nil"
              disabled={!canAnswer}
              onClick={() => void logNil()}
              aria-label={`Nil, ${spoken}`}
            >
              Nil
            </button>
            <button
              type="button"
              className="fd-heard"
              disabled={!canAnswer}
              onClick={() => openPad('planned')}
              aria-label={`Heard, ${spoken}`}
            >
              Heard
            </button>
          </div>
        </div>
      }
    >
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
          offers={entry.offers.map((offer) => (
            <button
              key={offer.label}
              type="button"
              className="fd-offer num"
              onClick={() => entry.setText(offer.text)}
            >
              {offer.label}
            </button>
          ))}
          onEnter={() => openPad('planned')}
        />
        <ModeChips mode={mode} onMode={entry.setMode} />
        <p className="soft small">
          Nil and Heard: you chose this frequency before you listened. By chance: you simply met the signal;
          it gives scores, and counts in no rate.
        </p>
      </div>
    </Frame>
  );
}

/** The one target of the outing's list on this very frequency that should be on the air, or is the only one there. */
function targetOn(frequencyHz: number | null, targets: readonly StoredTarget[]): StoredTarget | null {
  const there = targets.filter(({ fields }) => fields.frequencyHz === frequencyHz);
  if (there.length <= 1) return there[0] ?? null;
  const onAir = there.filter(({ fields }) => onAirState(fields, Date.now()).kind === 'on');
  return onAir.length === 1 ? onAir[0]! : null;
}

function Frame(props: { readonly children: React.ReactNode; readonly foot?: React.ReactNode }) {
  return (
    <PageFrame title="Other frequency" back={{ to: paths.field(), label: 'Field' }} foot={props.foot}>
      {props.children}
    </PageFrame>
  );
}
