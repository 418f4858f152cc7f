import type { EvidenceFilter } from '@harkmoor/sync-model/evidence/filter';
import type { SquareCharacters } from '@harkmoor/sync-model/evidence/squares';
import type { EvidenceQuestion, Overview } from '../answers/questions';
import type { CoverageView, Subject } from './coverage-view';
import { hoursOf, isAllHours } from './hour-range';

/** How many receptions a square lists at first. */
export const LISTED_AT_FIRST = 25;

/** The subject that is shown: the most tried channel where none was chosen. */
export function shownSubject(
  view: CoverageView,
  overview: Overview,
): Exclude<Subject, { kind: 'most-tried' }> {
  if (view.subject.kind !== 'most-tried') return view.subject;
  const [most] = overview.channels;
  return most ? { kind: 'channel', key: most.key } : { kind: 'any' };
}

/** What the model is asked for a view, without its square. */
export function filterOf(view: CoverageView, overview: Overview): EvidenceFilter {
  return {
    ...subjectFilter(shownSubject(view, overview)),
    ...hoursFilter(view),
    ...sampleFilter(view, overview),
  };
}

/** All that is asked for one square, or for all of them; `characters`: as fine as the square is drawn. */
export function evidenceQuestion(
  view: CoverageView,
  overview: Overview,
  options: Pick<EvidenceQuestion, 'rings' | 'listed'>,
): EvidenceQuestion {
  const square =
    view.square === null ? {} : { square: { locator: view.square, characters: charactersOf(view.square) } };
  const sample = { ...sampleFilter(view, overview), ...square };
  const subject = shownSubject(view, overview);
  return {
    kind: 'evidence',
    filter: { ...filterOf(view, overview), ...square },
    dialFilter: { ...sample, ...(options.rings === 'channels' ? bandFilter(subject) : {}) },
    pickFilter: { ...sample, ...bandFilter(subject) },
    hoursNeeded: hoursOf(view.hours),
    ...options,
  };
}

/** How fine a square of the map with this locator is. */
export function charactersOf(locator: string): SquareCharacters {
  return locator.length <= 2 ? 2 : locator.length <= 4 ? 4 : 6;
}

function subjectFilter(subject: Subject): EvidenceFilter {
  if (subject.kind === 'channel') return { channelKey: subject.key };
  return bandFilter(subject);
}

function bandFilter(subject: Subject): EvidenceFilter {
  return subject.kind === 'band' ? { bandKey: subject.key } : {};
}

function hoursFilter({ hours }: CoverageView): EvidenceFilter {
  return isAllHours(hours) ? {} : { hoursUtc: hoursOf(hours) };
}

function sampleFilter(view: CoverageView, overview: Overview): EvidenceFilter {
  const { antenna } = view;
  const ofKind = (kind: string) =>
    overview.antennas.filter(({ antennaKind }) => antennaKind === kind).map(({ key }) => key);
  return {
    ...(view.monthKeys.length > 0 ? { monthKeys: view.monthKeys } : {}),
    ...(antenna.kind === 'one' ? { antennaIds: [antenna.antennaId] } : {}),
    ...(antenna.kind === 'kind' ? { antennaIds: ofKind(antenna.antennaKind) } : {}),
    ...(view.setupId !== null ? { setupIds: [view.setupId] } : {}),
    ...(view.operatorId !== null ? { ownerIds: [view.operatorId] } : {}),
  };
}
