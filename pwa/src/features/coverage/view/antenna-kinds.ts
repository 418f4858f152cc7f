import type { Antenna } from '@harkmoor/sync-model/records/antenna';

export type AntennaKindName = Antenna['kind'];

/** A kind of antenna as a choice among all of that kind. */
export const ANTENNA_KIND_WORDS: Readonly<Record<AntennaKindName, string>> = {
  whip: 'Any whip',
  wire: 'Any wire',
  dipole: 'Any dipole',
  vertical: 'Any vertical',
  ferrite: 'Any ferrite',
  loop: 'Any loop',
  active: 'Any active',
  beam: 'Any beam',
  other: 'Any other kind',
};
