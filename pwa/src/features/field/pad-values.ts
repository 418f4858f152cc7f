import { canonicalJson } from '@harkmoor/sync-model/merge/canonical-json';
import { scoresToSave, type OutlinedScores } from '@harkmoor/sync-model/records/score-draft';
import { withoutScores } from '@harkmoor/sync-model/records/reception-from-tap';
import { formatSinpo } from '@harkmoor/sync-model/radio/signal/sinpo';
import { formatRst } from '@harkmoor/sync-model/radio/signal/rst';
import type { Reception } from '@harkmoor/sync-model/records/reception';
import type { PadValues } from './data/pad-drafts';

/** The reception that saving the pad stores. `base` is what the tap made, or the entry that is edited. */
export function receptionFromPad(base: Reception, values: PadValues, outlined: OutlinedScores): Reception {
  const isHeard = values.outcome === 'heard';
  const scores = scoresToSave(values.scores, outlined);
  const pending = cleanText(values.programmeText);
  const programme =
    pending === null
      ? values.programme
      : [...values.programme, { at: values.programmeAt ?? values.atMs, text: pending }];
  return {
    ...base,
    outcome: values.outcome,
    nilReason: values.outcome === 'nil' ? values.nilReason : null,
    deviceAt: values.atMs,
    setupId: values.setupId,
    tuning: { dialHz: values.dialHz, mode: values.mode },
    identity: values.identity,
    stationName: cleanText(values.stationName),
    remarks: cleanText(values.remarks),
    programme: programme.length > 0 ? programme : null,
    ...(isHeard ? scores : { ...withoutScores(), noiseMeter: values.scores.noiseMeter ?? null }),
  };
}

/** What the key says that it saves: "Save 4433X". Carried figures are no score of this entry. */
export function saveWords(base: Reception, values: PadValues, outlined: OutlinedScores): string {
  if (values.outcome === 'nil') return 'Save nil';
  if (values.outcome === 'skipped') return 'Save as skipped';
  const { sinpo, rst, carried } = receptionFromPad(base, values, outlined);
  if (sinpo && !carried?.includes('sinpo')) return `Save ${formatSinpo(sinpo)}`;
  if (rst && !carried?.includes('rst')) return `Save ${formatRst(rst)}`;
  return 'Save heard, no scores';
}

/** Control characters but tab and line ends; written as a range of properties, for they cannot be typed here. */
const CONTROL = /[^\P{Cc}\t\n\r]/gu;

/** Composed (NFC), without control characters and outer spaces; null where nothing remains: what the records hold. */
export function cleanText(text: string): string | null {
  const clean = text.normalize('NFC').replace(CONTROL, '').trim();
  return clean === '' ? null : clean;
}

/** Whether two states of the pad would save the same. Values are plain data, made by the same code in the same order. */
export function samePadValues(a: PadValues, b: PadValues): boolean {
  const saved = ({ title: _title, path: _path, ...rest }: PadValues) => canonicalJson(rest);
  return saved(a) === saved(b);
}
