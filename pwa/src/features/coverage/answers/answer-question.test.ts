import { describe, expect, it } from 'vitest';
import {
  anInput,
  aReception,
  DAY_MS,
  EVENING,
} from '@harkmoor/sync-model/evidence/testing/invented-evidence';
import { readView } from '../view/coverage-view';
import { evidenceQuestion, filterOf } from '../view/evidence-filters';
import { answerQuestion } from './answer-question';
import { countClub, type ClubNames } from './counted-club';
import type { EvidenceAnswer, SquaresAnswer } from './questions';
import { overviewOf } from './overview';

const NAMES: ClubNames = {
  sites: new Map([['dune', 'Ravnklit dune']]),
  receivers: new Map([['bench', 'Bench set']]),
  antennas: new Map([['wire', { name: 'Long wire', kind: 'wire', ownerId: 'asta' }]]),
  setups: new Map([['bench-wire', { receiverId: 'bench', antennaId: 'wire', ownerId: 'asta' }]]),
  targets: new Map([['plover', 'Radio Plover']]),
  people: new Map(),
};

/** Six evenings at the dune and one at the heath, whose place is shared at four characters. */
function invented() {
  const evenings = Array.from({ length: 6 }, (_, day) =>
    aReception(`dune-${day}`, { deviceAt: EVENING + day * DAY_MS, outcome: day < 4 ? 'heard' : 'nil' }),
  );
  const others = [
    aReception('heath', { siteId: 'heath', deviceAt: EVENING }),
    aReception('met', { deviceAt: EVENING + 60_000, basis: 'chance' }),
  ];
  return countClub(anInput([...evenings, ...others]), NAMES);
}

describe('what a club’s evidence answers', () => {
  it('should offer what was tried, most tried first, by name', () => {
    const overview = overviewOf(invented());
    expect(overview).toMatchObject({ receptions: 8, observations: 7, monthKeys: ['2026-11'] });
    expect(overview.channels[0]).toMatchObject({ key: '6070000', n: 7 });
    expect(overview.antennas[0]).toMatchObject({ label: 'Long wire', antennaKind: 'wire' });
    expect(overview.setups[0]?.label).toBe('Bench set, Long wire');
  });

  it('should tell two of a name apart by their owners', () => {
    const twins = (ownerId: string) => ({ name: 'Whip', kind: 'whip' as const, ownerId });
    const names = {
      ...NAMES,
      antennas: new Map([
        ['wire', twins('asta')],
        ['whip', twins('bo')],
      ]),
      people: new Map([
        ['asta', 'Asta'],
        ['bo', 'Bo'],
      ]),
    };
    const receptions = [aReception('a'), aReception('b', { setupId: 'bench-whip' })];
    const overview = overviewOf(countClub(anInput(receptions), names));
    expect(overview.antennas.map(({ label }) => label).sort()).toEqual(['Whip · Asta', 'Whip · Bo']);
  });

  it('should never place a site that is shared at four characters finer', () => {
    const club = invented();
    const filter = filterOf(readView(''), overviewOf(club));
    const { squares, n } = answerQuestion(club, { kind: 'squares', filter, characters: 6 }) as SquaresAnswer;
    expect(squares.map(({ locator, coarseOnly }) => [locator, coarseOnly])).toEqual([
      ['JO46', true],
      ['JO46ac', false],
    ]);
    expect(n).toBe(7);
  });

  it('should open a square down to its receptions and to those left out', () => {
    const club = invented();
    const question = evidenceQuestion(readView('square=JO46ac'), overviewOf(club), {
      rings: 'channels',
      listed: 3,
    });
    const answer = answerQuestion(club, question) as EvidenceAnswer;
    expect(answer.rate).toMatchObject({ n: 6, heard: 4, dates: 6 });
    expect(answer.receptions.map(({ receptionId }) => receptionId)).toEqual(['dune-5', 'dune-4', 'dune-3']);
    expect(answer.receptions[0]).toMatchObject({ siteName: 'Ravnklit dune', antennaName: 'Long wire' });
    expect(answer.leftOut).toMatchObject([{ reason: 'chance', count: 1, lines: [{ receptionId: 'met' }] }]);
    expect(answer.dial.rings.map(({ key }) => key)).toEqual(['6070000']);
  });

  it('should match nothing for a kind of antenna that the club has none of', () => {
    const club = invented();
    const filter = filterOf(readView('antenna-kind=beam'), overviewOf(club));
    const answer = answerQuestion(club, { kind: 'squares', filter, characters: 6 }) as SquaresAnswer;
    expect(answer).toEqual({ squares: [], n: 0 });
  });
});
