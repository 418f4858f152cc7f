import { Fragment, useEffect, useState } from 'react';
import { useIonRouter } from '@ionic/react';
import { frequencyText } from '@harkmoor/sync-model/radio/bands/frequency-text';
import { Button } from '../../design/button/Button';
import { useSay } from '../../design/notice/notices';
import { useHand } from '../../platform/hand';
import { utcHourMinute } from '../../platform/utc-text';
import { buzz } from '../../platform/vibrate';
import { useClub } from './data/club';
import type { PadStart } from './data/pad-start';
import { useOwnOutings } from './data/running-outing';
import { PadDetails } from './PadDetails';
import { PadScores } from './PadScores';
import { saveWords } from './pad-values';
import { InFoot, InSubtitle } from './ui/FieldFrame';
import { OutcomeChoice } from './ui/OutcomeChoice';
import { useGoToField } from './use-go-to-field';
import { usePadForm, type PadForm } from './use-pad-form';
import { bandWords } from './words';

/** A second tap on *Heard* must not fall through onto the pad that opened under it. */
const WAKE_AFTER_MS = 300;

type ReadyStart = Extract<PadStart, { kind: 'ready' }>;
type PadScreenProps = { readonly start: ReadyStart; readonly onTitle: (title: string) => void };

/** The pad over one entry: five figures, the meter, what else is worth a note, and *Save*, live at any time. */
export function PadScreen({ start, onTitle }: PadScreenProps) {
  const { base, outlined, setups } = start;
  const form = usePadForm(start);
  const { values } = form;
  const hand = useHand();
  const isAwake = useAwake();
  const { save, bin } = useEndOfPad(form);
  const setup = setups.find(({ id }) => id === values.setupId);
  const title = frequencyText(values.dialHz);
  useEffect(() => onTitle(title), [onTitle, title]);
  return (
    <div className="fd fd-pad" data-hand={hand} style={isAwake ? undefined : { pointerEvents: 'none' }}>
      <InSubtitle>
        <PadFacts values={values} targetName={start.targetName} setupLabel={setup?.label} />
      </InSubtitle>
      {values.isEdit ? <OutcomeChoice form={form} basis={base.basis} /> : null}
      {values.outcome === 'heard' ? (
        <PadScores form={form} outlined={outlined} meterScale={setup?.meterScale ?? null} />
      ) : null}
      <PadDetails form={form} base={base} setups={setups} onBin={values.isEdit ? bin : undefined} />
      <InFoot>
        <div className="fd-save">
          <Button wide busy={form.isSaving} onClick={save}>
            {saveWords(base, values, outlined)}
          </Button>
        </div>
      </InFoot>
    </div>
  );
}

/** Saving and binning, and where each leads: an edit back to where it was opened, a new entry to Field. */
function useEndOfPad(form: PadForm): { save: () => void; bin: () => void } {
  const { isEdit, outingId } = form.values;
  const router = useIonRouter();
  const goToField = useGoToField();
  const say = useSay();
  const running = useOwnOutings()?.running;
  const leave = (): void => {
    if (isEdit && router.canGoBack()) router.goBack();
    else goToField();
  };
  const save = (): void => {
    buzz();
    void form.save().then((isDone) => isDone && leave());
  };
  const bin = (): void => {
    void form.bin().then((isDone) => {
      if (!isDone) return;
      // in a running outing Field's own line says so, with *Put back*
      if (running?.id !== outingId) say('The entry is in the bin. It can be put back for 30 days.');
      leave();
    });
  };
  return { save, bin };
}

type PadFactsProps = {
  readonly values: PadForm['values'];
  readonly targetName: string | null;
  readonly setupLabel: string | undefined;
};

function PadFacts({ values, targetName, setupLabel }: PadFactsProps) {
  const { ituRegion } = useClub();
  const facts = [
    bandWords(values.dialHz, ituRegion),
    values.stationName || targetName,
    `${values.outcome} ${utcHourMinute(values.atMs)} UTC`,
    setupLabel,
  ].filter(Boolean);
  return (
    <span className="fd-facts num">
      {facts.map((fact, index) => (
        <Fragment key={index}>
          {index > 0 ? ' · ' : ''}
          <span>{fact}</span>
        </Fragment>
      ))}
    </span>
  );
}

function useAwake(): boolean {
  const [isAwake, setAwake] = useState(false);
  useEffect(() => {
    const timer = setTimeout(() => setAwake(true), WAKE_AFTER_MS);
    return () => clearTimeout(timer);
  }, []);
  return isAwake;
}
