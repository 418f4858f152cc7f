import { parseStamp } from '../stamp/stamp.js';
import { channelLookup, type ChannelLookup } from './channel-lookup.js';
import { clockIndex, correctedBy, type ClockIndex, type TimeBasis } from './corrected-time.js';
import { correctedFrequencyHz, type FrequencyCheck } from './corrected-frequency.js';
import type { EvidenceInput, EvidenceReception } from './evidence-input.js';
import { receptionLevelDbm, receptionScore } from './reception-level.js';
import { classifyReception, type Classification, type LeftOutReason } from './tries.js';

const HOUR_MS = 3_600_000;
const DAY_MS = 86_400_000;

/** One reception as the counting sees it: derived figures only, small enough to hold for each of 100 000. */
export type Entry = {
  readonly receptionId: string;
  readonly ownerId: string | null;
  readonly siteId: string;
  readonly setupId: string;
  /** Null where the device does not hold the setup. */
  readonly antennaId: string | null;
  readonly receiverId: string | null;
  readonly targetId: string | null;
  readonly channelKey: string;
  /** "49 m broadcast"; null outside every band of the region. */
  readonly bandKey: string | null;
  /** The channel is the whole band, as in amateur bands. */
  readonly isWholeBand: boolean;
  /** The channel's frequency, or the one met where the channel is a band; Hz. */
  readonly frequencyHz: number;
  /** Corrected time, UTC ms. */
  readonly atMs: number;
  readonly timeBasis: TimeBasis;
  readonly hourUtc: number;
  /** UTC days since 1970-01-01. */
  readonly dayNumber: number;
  /** UTC month, "2026-11". */
  readonly monthKey: string;
  readonly heard: boolean;
  /** Overall score 1–5; null where not judged. */
  readonly o: number | null;
  /** Level at the antenna's end of the setup, dBm. */
  readonly levelDbm: number | null;
  readonly isInReview: boolean;
  readonly counts: Classification['counts'];
  readonly reason: LeftOutReason | null;
};

/**
 * Derives and classifies every reception once. A reception whose values were blanked after 30 days in the bin is
 * no entry. Entries come in the order of the receptions.
 */
export function entriesOf(input: EvidenceInput): Entry[] {
  const context = contextOf(input);
  const entries: Entry[] = [];
  for (const reception of input.receptions) {
    if (!isBlanked(reception)) entries.push(entryOf(reception, context));
  }
  return entries;
}

type EntryContext = {
  readonly input: EvidenceInput;
  readonly clocks: ClockIndex;
  readonly channels: ChannelLookup;
  readonly dialChecks: ReadonlyMap<string, readonly FrequencyCheck[]>;
  readonly monthKeys: Map<number, string>;
};

function contextOf(input: EvidenceInput): EntryContext {
  const steps = input.outings.flatMap(({ fields, clockStepsStamp }) =>
    // Emptied after 30 days in the bin, an outing has lost its steps.
    (fields.clockSteps ?? []).map(({ at }) => ({ at, deviceId: parseStamp(clockStepsStamp).deviceId })),
  );
  const dialChecks = new Map<string, FrequencyCheck[]>();
  for (const check of input.dialChecks) {
    const checks = dialChecks.get(check.receiverId);
    if (checks) checks.push(check);
    else dialChecks.set(check.receiverId, [check]);
  }
  return {
    input,
    clocks: clockIndex(input.clockChecks, steps),
    channels: channelLookup(input.region),
    dialChecks,
    monthKeys: new Map(),
  };
}

function entryOf({ id, ownerId, fields, deviceAtStamp }: EvidenceReception, context: EntryContext): Entry {
  const { input } = context;
  const setup = input.setups.get(fields.setupId);
  const scale = setup && input.receivers.get(setup.receiverId)?.meterScale;
  const { atMs, basis } = correctedBy(context.clocks, {
    deviceAt: fields.deviceAt,
    deviceId: parseStamp(deviceAtStamp).deviceId,
  });
  const channel = context.channels(trueDialHz(fields, setup?.receiverId, atMs, context), fields.targetHz);
  const { counts, reason } = classifyReception(fields, {
    atMs,
    target: fields.targetId === null ? undefined : input.targets.get(fields.targetId),
    hasSetup: Boolean(setup?.antennaId),
    isExcluded: input.excludedIds?.has(id) ?? false,
  });
  const hour = Math.floor(atMs / HOUR_MS);
  const dayNumber = Math.floor(hour / 24);
  const heard = fields.outcome === 'heard';
  return {
    receptionId: id,
    ownerId,
    siteId: fields.siteId,
    setupId: fields.setupId,
    antennaId: setup?.antennaId ?? null,
    receiverId: setup?.receiverId ?? null,
    targetId: fields.targetId,
    channelKey: channel.channelKey,
    bandKey: channel.bandKey,
    isWholeBand: channel.isWholeBand,
    frequencyHz: channel.frequencyHz,
    atMs,
    timeBasis: basis,
    hourUtc: hour - dayNumber * 24,
    dayNumber,
    monthKey: monthKeyOf(dayNumber, context.monthKeys),
    heard,
    o: heard ? receptionScore(fields) : null,
    levelDbm: heard && setup && scale ? receptionLevelDbm(fields, setup, scale) : null,
    isInReview: input.inReviewIds?.has(id) ?? false,
    counts,
    reason,
  };
}

/** The dial with its error taken off; as it is where the target tells the channel and the dial is not asked. */
function trueDialHz(
  { tuning, targetHz }: EvidenceReception['fields'],
  receiverId: string | undefined,
  atMs: number,
  { dialChecks }: EntryContext,
): number {
  const checks = receiverId === undefined || targetHz !== null ? undefined : dialChecks.get(receiverId);
  return checks ? correctedFrequencyHz(tuning.dialHz, checks, atMs).frequencyHz : tuning.dialHz;
}

/** The server blanks a record after its 30 days in the bin: then only id and stamps are left. */
function isBlanked({ fields }: EvidenceReception): boolean {
  return fields.deleted && !(fields.tuning && fields.siteId);
}

function monthKeyOf(dayNumber: number, known: Map<number, string>): string {
  let monthKey = known.get(dayNumber);
  if (monthKey === undefined) {
    monthKey = new Date(dayNumber * DAY_MS).toISOString().slice(0, 7);
    known.set(dayNumber, monthKey);
  }
  return monthKey;
}
