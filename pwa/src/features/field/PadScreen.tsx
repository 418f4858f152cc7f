import { useEffect, useState } from 'react';
import { useIonRouter } from '@ionic/react';
import { frequencyText } from '@harkmoor/sync-model/radio/bands/frequency-text';
import { Button } from '../../design/button/Button';
import { useSay } from '../../design/notice/notices';
import { PageFrame } from '../../design/page/PageFrame';
import { useHand } from '../../platform/hand';
import { paths } from '../../platform/paths';
import { utcHourMinute } from '../../platform/utc-text';
import { buzz } from '../../platform/vibrate';
import { useClub } from './data/club';
import type { PadStart } from './data/pad-start';
import { PadDetails } from './PadDetails';
import { PadScores } from './PadScores';
import { saveWords } from './pad-values';
import { OutcomeChoice } from './ui/OutcomeChoice';
import { useGoToField } from './use-go-to-field';
import { usePadForm } from './use-pad-form';
import { bandWords } from './words';
import './ui/field.css';

/** A second tap on *Heard* must not fall through onto the pad that opened under it. */
const WAKE_AFTER_MS = 300;

/** The pad over one entry: five figures, the meter, what else is worth a note, and *Save*, live at any time. */
export function PadScreen({ start }: { readonly start: Extract<PadStart, { kind: 'ready' }> }) {
  const { base, outlined, targetName, setups } = start;
  const form = usePadForm(start);
  const { values } = form;
  const { ituRegion } = useClub();
  const hand = useHand();
  const router = useIonRouter();
  const goToField = useGoToField();
  const say = useSay();
  const isAwake = useAwake();
  const setup = setups.find(({ id }) => id === values.setupId);
  const leave = (): void => {
    if (values.isEdit && router.canGoBack()) router.goBack();
    else goToField();
  };
  const save = async (): Promise<void> => {
    buzz();
    if (await form.save()) leave();
  };
  const bin = async (): Promise<void> => {
    if (!(await form.bin())) return;
    say('The entry is in the bin. It can be put back for 30 days.');
    leave();
  };
  const outcome = { heard: 'heard', nil: 'nil', skipped: 'skipped' }[values.outcome];
  const facts = [
    bandWords(values.dialHz, ituRegion),
    values.stationName || targetName,
    `${outcome} ${utcHourMinute(values.atMs)} UTC`,
    setup?.label,
  ];
  return (
    <PageFrame
      title={frequencyText(values.dialHz)}
      subtitle={<span className="num">{facts.filter(Boolean).join(' · ')}</span>}
      back={{ to: paths.field(), label: 'Field' }}
      foot={
        <div className="fd-save">
          <Button wide busy={form.isSaving} onClick={() => void save()}>
            {saveWords(base, values, outlined)}
          </Button>
        </div>
      }
    >
      <div className="fd fd-pad" data-hand={hand} style={isAwake ? undefined : { pointerEvents: 'none' }}>
        {values.isEdit ? <OutcomeChoice form={form} basis={base.basis} /> : null}
        {values.outcome === 'heard' ? (
          <PadScores form={form} outlined={outlined} meterScale={setup?.meterScale ?? null} />
        ) : null}
        <PadDetails
          form={form}
          base={base}
          setups={setups}
          onBin={values.isEdit ? () => void bin() : undefined}
        />
      </div>
    </PageFrame>
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
