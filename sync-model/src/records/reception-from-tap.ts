import type { Mode } from './common-fields.js';
import type { Outing } from './outing.js';
import type { Reception } from './reception.js';
import type { Target } from './target.js';

export type NilReason = NonNullable<Reception['nilReason']>;

/** What was tapped: a row of the round, or a frequency that was entered. */
export type TapSubject =
  | { kind: 'row'; targetId: string; target: TapTarget; roundNo: number }
  | {
      kind: 'frequency';
      dialHz: number;
      mode: Mode;
      /** `planned`: chosen before listening. `chance`: simply met; it gives scores and never a rate. */
      basis: 'planned' | 'chance';
      /** The target of the outing's list that stands on this very frequency, if one does. */
      target?: { id: string; fields: TapTarget };
    };

export type TapTarget = Pick<Target, 'name' | 'frequencyHz' | 'mode'>;

export type Tap = {
  outcome: Reception['outcome'];
  subject: TapSubject;
  outingId: string;
  outing: Pick<Outing, 'siteId' | 'currentSetupId' | 'eventId'>;
  /** Device clock at the moment of the tap, ms UTC: the time of the entry, never corrected in place. */
  deviceAtMs: number;
  nilReason?: NilReason;
};

/**
 * The reception that one tap makes: the site and setup of the outing as they are now, the target's frequency
 * as it is now, the tap's own moment, and nothing judged yet. Throws for a chance find that was not heard:
 * the screens have no such answer, and a nil that nobody looked for would be no evidence.
 */
export function receptionFromTap(tap: Tap): Reception {
  const { subject, outing } = tap;
  if (subject.kind === 'frequency' && subject.basis === 'chance' && tap.outcome !== 'heard') {
    throw new Error('a signal met by chance can only be heard');
  }
  const target = subject.kind === 'row' ? subject.target : (subject.target?.fields ?? null);
  const targetId = subject.kind === 'row' ? subject.targetId : (subject.target?.id ?? null);
  return {
    deleted: false,
    importId: null,
    outingId: tap.outingId,
    siteId: outing.siteId,
    setupId: outing.currentSetupId,
    targetId,
    targetHz: target?.frequencyHz ?? null,
    eventId: outing.eventId,
    swap: null,
    roundNo: subject.kind === 'row' ? subject.roundNo : null,
    outcome: tap.outcome,
    basis: subject.kind === 'row' ? 'round' : subject.basis,
    identity: target ? 'sure' : 'unknown',
    nilReason: tap.outcome === 'nil' ? (tap.nilReason ?? null) : null,
    deviceAt: tap.deviceAtMs,
    durationS: null,
    tuning:
      subject.kind === 'row'
        ? { dialHz: subject.target.frequencyHz, mode: subject.target.mode }
        : { dialHz: subject.dialHz, mode: subject.mode },
    bandwidthHz: null,
    attenuationDb: null,
    sinpo: null,
    rst: null,
    meter: null,
    noiseMeter: null,
    carried: null,
    programme: null,
    remarks: null,
    stationName: null,
    heardBy: null,
  };
}

/** What must go when an entry turns into a nil or a skip: a nil never shows a score or a level of the signal. */
export function withoutScores(): Pick<Reception, 'sinpo' | 'rst' | 'meter' | 'carried'> {
  return { sinpo: null, rst: null, meter: null, carried: null };
}
