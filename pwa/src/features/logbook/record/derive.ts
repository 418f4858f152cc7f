import { channelLookup } from '@harkmoor/sync-model/evidence/channel-lookup';
import {
  correctedFrequencyHz,
  type CorrectedFrequency,
} from '@harkmoor/sync-model/evidence/corrected-frequency';
import { clockIndex, correctedBy, type CorrectedTime } from '@harkmoor/sync-model/evidence/corrected-time';
import { receptionLevelDbm } from '@harkmoor/sync-model/evidence/reception-level';
import { classifyReception, type Classification } from '@harkmoor/sync-model/evidence/tries';
import { stampOf } from '@harkmoor/sync-model/merge/record-state';
import { levelDbm } from '@harkmoor/sync-model/radio/signal/meter';
import { parseStamp } from '@harkmoor/sync-model/stamp/stamp';
import type { HeldReception } from '../data/held-reception';

/** What follows from the raw readings; nothing of it is stored. */
export type Derived = {
  readonly time: CorrectedTime;
  /** Set where a dial check of the receiver is known. */
  readonly frequency: CorrectedFrequency;
  readonly channelKey: string;
  /** The channel's frequency; null where the channel is the whole band. */
  readonly channelHz: number | null;
  /** "49 m broadcast"; null outside every band of the region. */
  readonly band: string | null;
  /** Level at the antenna's end of the setup, dBm. */
  readonly signalDbm: number | null;
  /** The noise by the same scale at the same end, dBm. */
  readonly noiseDbm: number | null;
  readonly evidence: Classification;
};

/** Derives everything by the same functions by which evidence is counted. */
export function derive(held: HeldReception): Derived {
  const { fields } = held.record;
  const time = trueTime(held);
  const frequency = correctedFrequencyHz(fields.tuning.dialHz, held.dialChecks, time.atMs);
  const placed = channelLookup(held.region)(
    fields.targetHz === null ? frequency.frequencyHz : fields.tuning.dialHz,
    fields.targetHz,
  );
  const evidence = classifyReception(fields, {
    atMs: time.atMs,
    target: held.target ?? undefined,
    hasSetup: Boolean(held.setup?.antennaId),
    isExcluded: false,
  });
  return {
    time,
    frequency,
    channelKey: placed.channelKey,
    channelHz: placed.isWholeBand ? null : placed.frequencyHz,
    band: placed.bandKey,
    ...levelsOf(held),
    evidence,
  };
}

function trueTime({ record, clockChecks, outingsAround }: HeldReception): CorrectedTime {
  const steps = outingsAround.flatMap(({ fields, clockStepsStamp }) =>
    (fields.clockSteps ?? []).map(({ at }) => ({ at, deviceId: parseStamp(clockStepsStamp).deviceId })),
  );
  return correctedBy(clockIndex(clockChecks, steps), {
    deviceAt: record.fields.deviceAt,
    deviceId: parseStamp(stampOf(record, 'deviceAt')).deviceId,
  });
}

function levelsOf({ record, setup, receiver }: HeldReception): Pick<Derived, 'signalDbm' | 'noiseDbm'> {
  const { fields } = record;
  const scale = receiver?.meterScale;
  if (!setup || !scale) return { signalDbm: null, noiseDbm: null };
  const { noiseMeter, carried } = fields;
  const noise =
    noiseMeter === null || carried?.includes('noiseMeter')
      ? null
      : levelDbm(noiseMeter, scale, fields.tuning.dialHz);
  return {
    signalDbm: receptionLevelDbm(fields, setup, scale),
    noiseDbm: noise === null ? null : noise + (fields.attenuationDb ?? setup.attenuationDb) - setup.preampDb,
  };
}
