import type { Entry } from '@harkmoor/sync-model/evidence/entries';
import { filterObservations, rateFor } from '@harkmoor/sync-model/evidence/filter';
import { hourDial } from '@harkmoor/sync-model/evidence/hour-dial';
import type { Observation } from '@harkmoor/sync-model/evidence/observations';
import { pickFrequency } from '@harkmoor/sync-model/evidence/pick-frequency';
import { squaresOf } from '@harkmoor/sync-model/evidence/squares';
import { evidenceOf, type LeftOut } from '@harkmoor/sync-model/evidence/summary';
import { typicalScore } from '@harkmoor/sync-model/evidence/typical-score';
import { antennaName, type CountedClub } from './counted-club';
import { overviewOf } from './overview';
import type {
  Answer,
  EvidenceAnswer,
  EvidenceQuestion,
  LeftOutLines,
  Question,
  ReceptionLine,
  SquaresAnswer,
} from './questions';

/** More rings than this cannot be told apart on a phone. */
export const DIAL_RINGS_MAX = 8;

/** Answers one question from a counted club. All figures come from the model; here they are only put together. */
export function answerQuestion(club: CountedClub, question: Question): Answer {
  switch (question.kind) {
    case 'overview':
      return overviewOf(club);
    case 'squares':
      return squaresAnswer(club, question);
    case 'evidence':
      return evidenceAnswer(club, question);
  }
}

function squaresAnswer(
  club: CountedClub,
  { filter, characters }: Extract<Question, { kind: 'squares' }>,
): SquaresAnswer {
  const observations = filterObservations(club.counted, filter, club.sites);
  const squares = squaresOf(observations, club.sites, characters);
  return {
    squares: squares.map((square) => ({
      locator: square.locator,
      coarseOnly: square.coarseOnly,
      rate: rateFor(square.observations, filter),
      score: typicalScore(square.observations),
    })),
    n: squares.reduce((sum, square) => sum + square.observations.length, 0),
  };
}

function evidenceAnswer(club: CountedClub, question: EvidenceQuestion): EvidenceAnswer {
  const evidence = evidenceOf(club.counted, club, question.filter);
  const behind = evidence.observations.slice(-question.listed).reverse();
  return {
    rate: evidence.rate,
    score: evidence.score,
    scoresBeside: evidence.scoresBeside,
    levels: evidence.levels.map((group) => ({
      ...group,
      receiverName:
        group.receiverId === null
          ? 'calibrated receivers'
          : club.names.receivers.get(group.receiverId) || 'unknown receiver',
    })),
    inReview: evidence.inReview,
    uncheckedTimes: evidence.uncheckedTimes,
    leftOut: leftOutLines(evidence.leftOut, club, question.listed),
    dial: dialAnswer(filterObservations(club.counted, question.dialFilter, club.sites), question),
    choices: pickFrequency(
      filterObservations(club.counted, question.pickFilter, club.sites),
      question.hoursNeeded,
    ),
    receptions: behind.map((observation) => lineOf(observation, club)),
  };
}

/** The rings with the most observations where there are more than a dial has room for; in their order. */
function dialAnswer(
  observations: readonly Observation[],
  { rings }: EvidenceQuestion,
): EvidenceAnswer['dial'] {
  const all = hourDial(observations, rings);
  const shown = new Set([...all].sort((a, b) => b.n - a.n).slice(0, DIAL_RINGS_MAX));
  return {
    rings: all.filter((ring) => shown.has(ring)),
    n: observations.length,
    ringsLeftOut: all.length - shown.size,
  };
}

function leftOutLines(leftOut: readonly LeftOut[], club: CountedClub, listed: number): LeftOutLines[] {
  const wanted = new Set(leftOut.flatMap(({ receptionIds }) => receptionIds.slice(-listed)));
  const lines = new Map<string, ReceptionLine>();
  for (const entry of club.counted.entries) {
    if (wanted.has(entry.receptionId)) lines.set(entry.receptionId, lineOf(entry, club));
  }
  return leftOut.map(({ reason, words, count, receptionIds }) => ({
    reason,
    words,
    count,
    lines: receptionIds
      .slice(-listed)
      .reverse()
      .flatMap((id) => lines.get(id) ?? []),
  }));
}

function lineOf(entry: Entry, { names }: CountedClub): ReceptionLine {
  const { receptionId, atMs, frequencyHz, heard, o, isInReview, targetId } = entry;
  return {
    receptionId,
    atMs,
    frequencyHz,
    heard,
    o,
    isInReview,
    siteName: names.sites.get(entry.siteId) || 'unknown site',
    antennaName: antennaName(names, entry.antennaId),
    targetName: targetId === null ? null : (names.targets.get(targetId) ?? null),
  };
}
