import type { EvidenceInput } from '@harkmoor/sync-model/evidence/evidence-input';
import { observationsOf, type Observations } from '@harkmoor/sync-model/evidence/observations';
import type { ItuRegion } from '@harkmoor/sync-model/radio/bands/region';
import type { Antenna } from '@harkmoor/sync-model/records/antenna';

export type AntennaKind = Antenna['kind'];

type Owned = { /** Null in a guest log. */ readonly ownerId: string | null };

/** What things are called; an id without a name is not held by this device, or was emptied after the bin. */
export type ClubNames = {
  readonly sites: ReadonlyMap<string, string>;
  readonly receivers: ReadonlyMap<string, string>;
  readonly antennas: ReadonlyMap<string, Owned & { readonly name: string; readonly kind: AntennaKind }>;
  readonly setups: ReadonlyMap<string, Owned & { readonly receiverId: string; readonly antennaId: string }>;
  readonly targets: ReadonlyMap<string, string>;
  /** By account. */
  readonly people: ReadonlyMap<string, string>;
};

/** A club's evidence, counted once for each change of its records; every screen is answered from it. */
export type CountedClub = {
  readonly region: ItuRegion;
  readonly counted: Observations;
  readonly sites: EvidenceInput['sites'];
  readonly receivers: EvidenceInput['receivers'];
  readonly names: ClubNames;
  /** All that this device holds, nils, chance and what counts nowhere too. */
  readonly receptionCount: number;
};

/** Counts a club's receptions by the one function of the model. */
export function countClub(input: EvidenceInput, names: ClubNames): CountedClub {
  const counted = observationsOf(input);
  return {
    region: input.region,
    counted,
    sites: input.sites,
    receivers: input.receivers,
    names,
    receptionCount: counted.entries.filter(({ reason }) => reason !== 'deleted').length,
  };
}

/** "Long wire", or words for gear that is not held. */
export function antennaName(names: ClubNames, antennaId: string | null): string {
  return (antennaId !== null && names.antennas.get(antennaId)?.name) || 'unknown antenna';
}

/** "Heron 3, long wire". */
export function setupName(names: ClubNames, setupId: string): string {
  const setup = names.setups.get(setupId);
  if (!setup) return 'unknown setup';
  const receiver = names.receivers.get(setup.receiverId) || 'unknown receiver';
  return `${receiver}, ${antennaName(names, setup.antennaId)}`;
}
