import type { ItuRegion } from '../radio/bands/region.js';
import type { ClockCheck } from '../records/clock-check.js';
import type { DialCheck } from '../records/dial-check.js';
import type { Outing } from '../records/outing.js';
import type { Receiver } from '../records/receiver.js';
import type { Reception } from '../records/reception.js';
import type { Setup } from '../records/setup.js';
import type { Site } from '../records/site.js';
import type { Target } from '../records/target.js';
import type { Stamp } from '../stamp/stamp.js';

/** The fields of a reception that evidence is made from; a host may load these columns alone. */
export type ReceptionFields = Pick<
  Reception,
  | 'deleted'
  | 'siteId'
  | 'setupId'
  | 'targetId'
  | 'targetHz'
  | 'outcome'
  | 'basis'
  | 'identity'
  | 'deviceAt'
  | 'durationS'
  | 'tuning'
  | 'attenuationDb'
  | 'sinpo'
  | 'meter'
  | 'carried'
>;

export type EvidenceReception = {
  readonly id: string;
  /** Null in a guest log. */
  readonly ownerId: string | null;
  readonly fields: ReceptionFields;
  /** Stamp of the `deviceAt` field: its device is the one whose clock was read. */
  readonly deviceAtStamp: Stamp;
};

export type EvidenceOuting = {
  readonly fields: Pick<Outing, 'clockSteps'>;
  /** Stamp of the `clockSteps` field: its device is the one whose clock jumped. */
  readonly clockStepsStamp: Stamp;
};

/**
 * All that the counting of evidence looks at, for one club. The host fills it from what it holds; nothing here
 * is private to anybody, so every member's device and the server count the same. Order never matters.
 */
export type EvidenceInput = {
  /** As the club has set it: it decides rasters and band edges. */
  readonly region: ItuRegion;
  readonly receptions: readonly EvidenceReception[];
  readonly sites: ReadonlyMap<string, Pick<Site, 'place'>>;
  readonly setups: ReadonlyMap<
    string,
    Pick<Setup, 'receiverId' | 'antennaId' | 'attenuationDb' | 'preampDb'>
  >;
  readonly receivers: ReadonlyMap<string, Pick<Receiver, 'meterScale'>>;
  /** Deleted targets too: what was logged for them stays evidence. */
  readonly targets: ReadonlyMap<string, Pick<Target, 'schedule' | 'silences'>>;
  readonly clockChecks: readonly ClockCheck[];
  readonly dialChecks: readonly DialCheck[];
  readonly outings: readonly EvidenceOuting[];
  /** Receptions that a review has excluded from evidence. */
  readonly excludedIds?: ReadonlySet<string>;
  /** Receptions in review: they count and are marked. */
  readonly inReviewIds?: ReadonlySet<string>;
};
