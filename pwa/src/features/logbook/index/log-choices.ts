import type { ChannelLookup } from '@harkmoor/sync-model/evidence/channel-lookup';
import { bandLabel, bandsOf } from '@harkmoor/sync-model/radio/bands/bands';
import { NO_BAND, OWN } from './log-filter';
import { operatorOf, stationOf, type LogNames } from './log-names';
import type { LogRow } from './log-row';

export type Choice = { readonly value: string; readonly label: string };

/** What the rows of a log hold to choose from, each list in the order in which it is looked through. */
export type LogChoices = {
  readonly bands: readonly Choice[];
  readonly stations: readonly Choice[];
  readonly antennas: readonly Choice[];
  readonly sites: readonly Choice[];
  readonly operators: readonly Choice[];
};

export function logChoices(rows: Iterable<LogRow>, names: LogNames, channels: ChannelLookup): LogChoices {
  const bands = new Set<string>();
  const stations = new Set<string>();
  const antennas = new Map<string, string>();
  const sites = new Map<string, string>();
  const operators = new Map<string, string>();
  for (const row of rows) {
    bands.add(channels(row.dialHz, row.targetHz).bandKey ?? NO_BAND);
    stations.add(stationOf(row, names));
    const antenna = names.antennas.get(row.setupId);
    if (antenna) antennas.set(antenna.antennaId, antenna.name);
    sites.set(row.siteId, names.sites.get(row.siteId) ?? 'Unknown site');
    const operator = operatorOf(row.ownerId, names);
    operators.set(operator === null ? OWN : row.ownerId!, operator ?? 'Me');
  }
  return {
    bands: bandsInOrder(bands, names),
    stations: byName(new Map([...stations].map((name) => [name, name]))),
    antennas: byName(antennas),
    sites: byName(sites),
    operators: byName(operators),
  };
}

/** From low to high; what lies outside every band last. */
function bandsInOrder(found: ReadonlySet<string>, { region }: LogNames): Choice[] {
  const labels = [...new Set(bandsOf(region).map(bandLabel))].filter((label) => found.has(label));
  const choices = labels.map((label) => ({ value: label, label }));
  return found.has(NO_BAND) ? [...choices, { value: NO_BAND, label: 'Outside all bands' }] : choices;
}

function byName(labels: ReadonlyMap<string, string>): Choice[] {
  return [...labels]
    .map(([value, label]) => ({ value, label }))
    .sort((a, b) => a.label.localeCompare(b.label, 'en'));
}
