import type { ItuRegion } from '@harkmoor/sync-model/radio/bands/region';

/** What the ids in the rows are called, as this device holds it; deleted and retired ones too. */
export type LogNames = {
  readonly region: ItuRegion;
  /** The account whose log it is; null for a guest. */
  readonly ownId: string | null;
  readonly targets: ReadonlyMap<string, string>;
  readonly sites: ReadonlyMap<string, string>;
  /** The antenna of a setup, and what it is called. */
  readonly antennas: ReadonlyMap<string, { readonly antennaId: string; readonly name: string }>;
  readonly people: ReadonlyMap<string, string>;
  readonly outings: ReadonlyMap<string, { readonly startedAt: number; readonly siteId: string }>;
  /** Receptions of which a value met another one that its writer had not seen. */
  readonly clashes: ReadonlySet<string>;
};

export const NO_STATION = 'Unnamed station';

/** What was heard or listened for: the name given at the entry, else the target's. */
export function stationOf(
  row: { readonly targetId: string | null; readonly stationName: string | null },
  names: LogNames,
): string {
  return row.stationName || (row.targetId && names.targets.get(row.targetId)) || NO_STATION;
}

/** Who made the entry; null for one's own. */
export function operatorOf(ownerId: string | null, names: LogNames): string | null {
  if (ownerId === null || ownerId === names.ownId) return null;
  return names.people.get(ownerId) ?? 'Former member';
}
