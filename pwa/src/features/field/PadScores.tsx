import { useState } from 'react';
import type { MeterScale } from '@harkmoor/sync-model/records/receiver';
import type { OutlinedScores } from '@harkmoor/sync-model/records/score-draft';
import { figureText } from '@harkmoor/sync-model/radio/figure-text';
import { levelDbm } from '@harkmoor/sync-model/radio/signal/meter';
import type { SinpoLetter } from '@harkmoor/sync-model/radio/signal/sinpo';
import { GradeWords } from '../../design/score-pad/GradeWords';
import { MeterKeys, type MeterSubject } from '../../design/score-pad/MeterKeys';
import { ScorePad } from '../../design/score-pad/ScorePad';
import type { PadForm } from './use-pad-form';

type PadScoresProps = {
  readonly form: PadForm;
  readonly outlined: OutlinedScores;
  /** Null where the setup is not on this phone: then an S-meter by the book. */
  readonly meterScale: MeterScale | null;
};

/** The five columns, the grade in words, and the meter where the receiver has one. */
export function PadScores({ form, outlined, meterScale }: PadScoresProps) {
  const { scores, dialHz } = form.values;
  const [touched, setTouched] = useState<SinpoLetter | null>(null);
  const [subject, setSubject] = useState<MeterSubject>('signal');
  const signal = scores.meter ?? null;
  const level = signal && meterScale ? levelDbm(signal, meterScale, dialHz) : null;
  return (
    <>
      <ScorePad
        figures={scores.sinpo}
        outlined={outlined.sinpo}
        onFigure={(letter, grade) => {
          setTouched(letter);
          form.changeScores({ sinpo: { ...scores.sinpo, [letter]: grade } });
        }}
      />
      <GradeWords figures={scores.sinpo} touched={touched} hasOutlines={outlined.sinpo !== null} />
      {meterScale?.kind === 'none' ? null : (
        <MeterKeys
          kind={meterScale?.kind === 'dbm' ? 'dbm' : 's'}
          signal={signal}
          noise={scores.noiseMeter ?? null}
          outlined={{ signal: outlined.meter, noise: outlined.noiseMeter }}
          subject={subject}
          onSubject={setSubject}
          onReading={(of, reading) =>
            form.changeScores(of === 'signal' ? { meter: reading } : { noiseMeter: reading })
          }
          levelText={level === null ? null : figureText(level, 0, 'dBm')}
        />
      )}
    </>
  );
}
