import { heardRate } from '@harkmoor/sync-model/evidence/heard-rate';
import { observationsOf, type Observation } from '@harkmoor/sync-model/evidence/observations';
import { DEMO_SEED, makeDemoClub } from '../../scripts/demo/demo-club.js';
import { DEMO_SILENCE } from '../../scripts/demo/demo-targets.js';
import { demoTruth } from '../../scripts/demo/demo-truth.js';
import { demoEvidenceInput } from './demo-evidence-input.js';

/*
 * Goal: what the product finds in the demo agrees with what its generator hid. Method: clubs of several seeds are
 * counted by the product's own function, and the generator's chances are averaged over the same tries.
 */

const CELL_N_MIN = 8;

describe('the demo against its truth', () => {
  it('should hold the true chance in its 95 % intervals at about that rate', () => {
    let held = 0;
    let cells = 0;
    for (let seed = DEMO_SEED; seed < DEMO_SEED + 6; seed++) {
      for (const { truth, low, high } of cellsOf(seed)) {
        cells += 1;
        if (truth >= low - 1e-9 && truth <= high + 1e-9) held += 1;
      }
    }
    expect(cells).toBeGreaterThan(400);
    expect(held / cells).toBeGreaterThan(0.93);
    // an interval that always holds the truth would be too wide to be of use
    expect(held / cells).toBeLessThan(0.995);
  });

  it('should be the same club at each making of one seed', () => {
    expect(makeDemoClub().changes).toEqual(makeDemoClub().changes);
    expect(makeDemoClub(1).changes).not.toEqual(makeDemoClub(2).changes);
  });

  it('should hear the silent station never in its week and often beside it', () => {
    const { channels } = observationsOf(demoEvidenceInput(makeDemoClub()));
    const own = channels.filter((row) => row.channelKey === '6070000');
    const within = own.filter((row) => row.atMs >= DEMO_SILENCE.from && row.atMs < DEMO_SILENCE.to);
    expect(within.length).toBeGreaterThan(5);
    expect(within.filter((row) => row.heard)).toEqual([]);
    expect(heardRate(own).heard).toBeGreaterThan(50);
  });

  it('should say the size and the shape that the club was meant to have', () => {
    const { changes } = makeDemoClub();
    const count = (type: string) => changes.filter((row) => row.change.type === type).length;
    expect([count('site'), count('receiver'), count('antenna')]).toEqual([30, 5, 8]);
    expect(count('reception')).toBeGreaterThan(5500);
    expect(count('reception')).toBeLessThan(7500);
    for (const { heardByHourUtc } of demoTruth().cells) {
      expect(heardByHourUtc).toHaveLength(24);
      expect(Math.min(...heardByHourUtc)).toBeGreaterThanOrEqual(0);
      expect(Math.max(...heardByHourUtc)).toBeLessThanOrEqual(1);
    }
  });
});

/** Each channel and UTC hour with enough tries: the interval found, and the mean true chance of its tries. */
function cellsOf(seed: number): { truth: number; low: number; high: number }[] {
  const demo = makeDemoClub(seed);
  const groups = new Map<string, Observation[]>();
  for (const row of observationsOf(demoEvidenceInput(demo)).channels) {
    const key = `${row.channelKey} ${row.hourUtc}`;
    groups.set(key, [...(groups.get(key) ?? []), row]);
  }
  return [...groups.values()]
    .filter((rows) => rows.length >= CELL_N_MIN)
    .map((rows) => {
      const chances = rows.map((row) => demo.chances.get(row.receptionId) ?? 0);
      const truth = chances.reduce((sum, chance) => sum + chance, 0) / chances.length;
      const { interval } = heardRate(rows);
      return { truth, low: interval!.low, high: interval!.high };
    });
}
