import type { EvidenceFilter } from '@harkmoor/sync-model/evidence/filter';
import type { DialRing, DialRings } from '@harkmoor/sync-model/evidence/hour-dial';
import type { HeardRate } from '@harkmoor/sync-model/evidence/heard-rate';
import type { LevelGroup } from '@harkmoor/sync-model/evidence/levels';
import type { FrequencyChoice } from '@harkmoor/sync-model/evidence/pick-frequency';
import type { SquareCharacters } from '@harkmoor/sync-model/evidence/squares';
import type { LeftOutReason } from '@harkmoor/sync-model/evidence/tries';
import type { TypicalScore } from '@harkmoor/sync-model/evidence/typical-score';
import type { AntennaKind } from './counted-club';

/** What a screen asks of a club's evidence. Questions and answers are plain data: they cross to a worker and back. */
export type Question =
  | { readonly kind: 'overview' }
  | { readonly kind: 'squares'; readonly filter: EvidenceFilter; readonly characters: SquareCharacters }
  | EvidenceQuestion;

export type EvidenceQuestion = {
  readonly kind: 'evidence';
  readonly filter: EvidenceFilter;
  /** The same question for all frequencies and hours, for the dial. */
  readonly dialFilter: EvidenceFilter;
  readonly rings: DialRings;
  /** The same question for all frequencies, for the choice among them. */
  readonly pickFilter: EvidenceFilter;
  readonly hoursNeeded: readonly number[];
  /** How many of the receptions behind the figure to list, newest first. */
  readonly listed: number;
};

export type Option = { readonly key: string; readonly label: string; readonly n: number };
export type AntennaOption = Option & { readonly antennaKind: AntennaKind };

/** What a club has, for the choices: each with its observations. */
export type Overview = {
  readonly receptions: number;
  readonly observations: number;
  /** Most observations first. */
  readonly channels: readonly (Option & { readonly bandKey: string | null })[];
  /** From low to high. */
  readonly bands: readonly Option[];
  /** UTC months with an observation, earliest first. */
  readonly monthKeys: readonly string[];
  readonly antennas: readonly AntennaOption[];
  readonly setups: readonly Option[];
  readonly operators: readonly Option[];
  /** Six characters of each place with an observation, or four where it is shared so. */
  readonly locators: readonly string[];
};

export type SquareFigures = {
  readonly locator: string;
  /** Shared more coarsely than asked for. */
  readonly coarseOnly: boolean;
  readonly rate: HeardRate;
  readonly score: TypicalScore;
};

export type SquaresAnswer = {
  readonly squares: readonly SquareFigures[];
  /** Observations in all of them. */
  readonly n: number;
};

/** A reception behind a figure. */
export type ReceptionLine = {
  readonly receptionId: string;
  readonly atMs: number;
  readonly frequencyHz: number;
  readonly heard: boolean;
  readonly o: number | null;
  readonly siteName: string;
  readonly antennaName: string;
  readonly targetName: string | null;
  readonly isInReview: boolean;
};

/** What is not in the figure, and why. */
export type LeftOutLines = {
  readonly reason: LeftOutReason;
  readonly words: string;
  readonly count: number;
  /** The first of them, as many as are listed. */
  readonly lines: readonly ReceptionLine[];
};

export type EvidenceAnswer = {
  readonly rate: HeardRate;
  readonly score: TypicalScore;
  readonly scoresBeside: TypicalScore;
  readonly levels: readonly (LevelGroup & { readonly receiverName: string })[];
  readonly inReview: number;
  readonly uncheckedTimes: number;
  readonly leftOut: readonly LeftOutLines[];
  readonly dial: {
    readonly rings: readonly DialRing[];
    readonly n: number;
    /** Rings that were tried but have no room. */
    readonly ringsLeftOut: number;
  };
  readonly choices: readonly FrequencyChoice[];
  readonly receptions: readonly ReceptionLine[];
};

export type AnswerTo<Q extends Question> = Q extends { kind: 'overview' }
  ? Overview
  : Q extends { kind: 'squares' }
    ? SquaresAnswer
    : EvidenceAnswer;
export type Answer = Overview | SquaresAnswer | EvidenceAnswer;
