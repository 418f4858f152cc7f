import type { ItuRegion } from '@harkmoor/sync-model/radio/bands/region';
import type { RecordType } from '@harkmoor/sync-model/records/record-types';
import { Dexie } from 'dexie';
import { HarkmoorDatabase } from '../../../store/database';
import { answerQuestion } from '../answers/answer-question';
import { countClub, type CountedClub } from '../answers/counted-club';
import type { Answer, Question } from '../answers/questions';
import { readClub } from './read-club';

/** Writes often come in runs: a round of the sync, a batch edit. */
const SETTLE_MS = 400;
const READ_TYPES: readonly RecordType[] = [
  'reception',
  'site',
  'setup',
  'receiver',
  'antenna',
  'target',
  'clock-check',
  'dial-check',
  'outing',
  'member',
];

export type ClubAddress = {
  readonly databaseName: string;
  readonly clubId: string;
  readonly region: ItuRegion;
};

export type EvidenceDesk = {
  /** Answers from the newest count there is; waits only for the first one. */
  ask(question: Question): Promise<Answer>;
  /** While nobody looks, a write is only noted: counting on each save would cost a phone in the field its battery. */
  watch(isWatched: boolean): void;
  close(): void;
};

/**
 * Reads and counts a club, and counts again after its records have changed here or in another tab. It runs in a
 * worker where there are workers. `onCounted` is called after each later count.
 */
export function openEvidenceDesk(
  { databaseName, clubId, region }: ClubAddress,
  onCounted: () => void,
): EvidenceDesk {
  const database = new HarkmoorDatabase(databaseName);
  const tables = new Set(READ_TYPES.map((type) => `idb://${databaseName}/${type}/`));
  let club: CountedClub | null = null;
  let counting: Promise<CountedClub> | null = null;
  let isWatched = true;
  let isStale = true;
  let timer: ReturnType<typeof setTimeout> | undefined;

  const count = (): Promise<CountedClub> => {
    isStale = false;
    counting ??= readClub(database, clubId, region)
      .then(({ input, names }) => (club = countClub(input, names)))
      .finally(() => {
        counting = null;
        if (isStale) settle();
      });
    return counting;
  };
  const recount = (): void => {
    if (!isWatched || !isStale || counting) return;
    count().then(onCounted, (error: unknown) => {
      isStale = true;
      console.error('the evidence could not be counted again', error);
    });
  };
  const settle = (): void => {
    clearTimeout(timer);
    timer = setTimeout(recount, SETTLE_MS);
  };
  const note = (parts: Record<string, unknown>): void => {
    if (!Object.keys(parts).some((part) => tables.has(part))) return;
    isStale = true;
    if (isWatched) settle();
  };
  Dexie.on.storagemutated.subscribe(note);
  return {
    ask: async (question) => answerQuestion(club ?? (await count()), question),
    watch: (watched) => {
      isWatched = watched;
      if (isWatched && isStale && club) settle();
    },
    close: () => {
      clearTimeout(timer);
      Dexie.on.storagemutated.unsubscribe(note);
      database.close();
    },
  };
}
