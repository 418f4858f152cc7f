import { sitePlaces } from '@harkmoor/sync-model/evidence/squares';
import type { Observation } from '@harkmoor/sync-model/evidence/observations';
import { channelWords } from '../view/channel-words';
import { antennaName, setupName, type ClubNames, type CountedClub } from './counted-club';
import type { Option, Overview } from './questions';

/** What can be asked of a club: its channels, bands, months, gear and people, each with its observations. */
export function overviewOf(club: CountedClub): Overview {
  const { names } = club;
  const observations = club.counted.channels;
  const bandOfChannel = new Map(observations.map(({ channelKey, bandKey }) => [channelKey, bandKey]));
  const lowestHz = lowestByBand(observations);
  const placeOf = sitePlaces(club.sites, 6);
  const locators = tally(observations, ({ siteId }) => placeOf(siteId)?.locator ?? null);
  return {
    receptions: club.receptionCount,
    observations: observations.length,
    channels: options(
      tally(observations, ({ channelKey }) => channelKey),
      channelWords,
    ).map((option) => ({ ...option, bandKey: bandOfChannel.get(option.key) ?? null })),
    bands: options(
      tally(observations, ({ bandKey }) => bandKey),
      (key) => key,
    ).sort((a, b) => lowestHz.get(a.key)! - lowestHz.get(b.key)!),
    monthKeys: [...tally(observations, ({ monthKey }) => monthKey).keys()].sort(),
    antennas: toldApart(
      options(
        tally(observations, ({ antennaId }) => antennaId),
        (id) => antennaName(names, id),
      ),
      (id) => ownerName(names, names.antennas.get(id)),
    ).map((option) => ({ ...option, antennaKind: names.antennas.get(option.key)?.kind ?? 'other' })),
    setups: toldApart(
      options(
        tally(observations, ({ setupId }) => setupId),
        (id) => setupName(names, id),
      ),
      (id) => ownerName(names, names.setups.get(id)),
    ),
    operators: options(
      tally(observations, ({ ownerId }) => ownerId),
      (id) => names.people.get(id) || 'former member',
    ),
    locators: [...locators.keys()].sort(),
  };
}

function tally(
  observations: readonly Observation[],
  keyOf: (observation: Observation) => string | null,
): Map<string, number> {
  const counts = new Map<string, number>();
  for (const observation of observations) {
    const key = keyOf(observation);
    if (key !== null) counts.set(key, (counts.get(key) ?? 0) + 1);
  }
  return counts;
}

function options(counts: ReadonlyMap<string, number>, label: (key: string) => string): Option[] {
  return [...counts.entries()]
    .sort(([a, m], [b, n]) => n - m || (a < b ? -1 : 1))
    .map(([key, n]) => ({ key, label: label(key), n }));
}

/** Names are not unique: where two are alike, the owner stands beside them. */
function toldApart(all: readonly Option[], ownerOf: (key: string) => string | null): Option[] {
  const alike = new Map<string, number>();
  for (const { label } of all) alike.set(label, (alike.get(label) ?? 0) + 1);
  return all.map((option) => {
    const owner = alike.get(option.label)! > 1 ? ownerOf(option.key) : null;
    return owner === null ? option : { ...option, label: `${option.label} · ${owner}` };
  });
}

function ownerName(names: ClubNames, owned: { ownerId: string | null } | undefined): string | null {
  if (!owned || owned.ownerId === null) return null;
  return names.people.get(owned.ownerId) || 'former member';
}

function lowestByBand(observations: readonly Observation[]): ReadonlyMap<string, number> {
  const lowest = new Map<string, number>();
  for (const { bandKey, frequencyHz } of observations) {
    if (bandKey !== null && frequencyHz < (lowest.get(bandKey) ?? Infinity)) lowest.set(bandKey, frequencyHz);
  }
  return lowest;
}
