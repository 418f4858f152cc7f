import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { mendToUndo, setupMend } from './batch-mend.js';
import { FORGOTTEN_AFTER_MS, forgottenSince } from './forgotten-outing.js';
import { outingFromStart } from './outing-from-start.js';
import { outingSchema } from './outing.js';
import { plainAntenna, plainReceiver, plainSetup, plainSite } from './gear-defaults.js';
import { RECORD_SCHEMAS } from './schemas.js';
import { isSetupQuestionDue, SETUP_QUESTION_EVERY_MS } from './setup-question.js';

const id = (n: number) => `01920000-0000-7000-8000-${String(n).padStart(12, '0')}`;
const START = Date.UTC(2026, 10, 12, 15);

describe('the question "Still long wire?"', () => {
  const confirmed = { setupId: id(1), atMs: START, roundNo: 1 };

  it('should come at a new round, and thirty minutes after it was last answered', () => {
    const now = { setupId: id(1), switchedAtMs: START, atMs: START + 60_000, roundNo: 1 };
    expect(isSetupQuestionDue(confirmed, now)).toBe(false);
    expect(isSetupQuestionDue(confirmed, { ...now, roundNo: 2 })).toBe(true);
    expect(isSetupQuestionDue(confirmed, { ...now, atMs: START + SETUP_QUESTION_EVERY_MS })).toBe(true);
  });

  it('should not come about a setup that was just chosen', () => {
    const now = { setupId: id(2), switchedAtMs: START + 9e6, atMs: START + 9e6, roundNo: 4 };
    expect(isSetupQuestionDue(confirmed, now)).toBe(false);
  });

  it('should come thirty minutes after a switch that this phone does not remember', () => {
    const now = { setupId: id(2), switchedAtMs: START + 9e6, atMs: START + 9e6, roundNo: 1 };
    const later = { ...now, atMs: now.switchedAtMs + SETUP_QUESTION_EVERY_MS };
    for (const remembered of [confirmed, null]) {
      expect(isSetupQuestionDue(remembered, now)).toBe(false);
      expect(isSetupQuestionDue(remembered, later)).toBe(true);
    }
  });
});

type MendEntry = Parameters<typeof setupMend>[0][number];
const entry = (
  n: number,
  deviceAt: number,
  setupId: string,
  more: Partial<MendEntry['fields']> = {},
): MendEntry => ({
  id: id(n),
  fields: { deviceAt, setupId, deleted: false, swap: null, ...more },
});

describe('changing the setup of a run of entries', () => {
  it('should reach entries since the moment that name another setup, and no deleted or swap entry', () => {
    const swap = { testId: id(90), pairNo: 1, arm: 0, order: 1 };
    const entries = [
      entry(1, START - 1, id(7)),
      entry(2, START, id(7)),
      entry(3, START + 1, id(8)),
      entry(4, START + 2, id(7), { deleted: true }),
      entry(5, START + 3, id(7), { swap }),
      entry(6, START + 4, id(9)),
    ];
    expect(setupMend(entries, START, id(8)).replaced).toEqual([
      { id: id(2), setupId: id(7) },
      { id: id(6), setupId: id(9) },
    ]);
  });

  it('should be taken back exactly by its undo, but for entries that were edited since', () => {
    const anyEntries = fc.array(
      fc.record({ at: fc.integer({ min: 0, max: 9 }), setup: fc.integer({ min: 1, max: 3 }) }),
    );
    fc.assert(
      fc.property(
        anyEntries,
        fc.integer({ min: 0, max: 9 }),
        fc.integer({ min: 1, max: 3 }),
        (made, since, to) => {
          const before = made.map(({ at, setup }, n) => entry(n, at, id(setup)));
          const mend = setupMend(before, since, id(to));
          const changed = new Set(mend.replaced.map((one) => one.id));
          const after = before.map((one) =>
            changed.has(one.id) ? entry(Number(one.id.slice(-12)), one.fields.deviceAt, id(to)) : one,
          );
          const back = new Map(mendToUndo(mend, after).map((one) => [one.id, one.setupId]));
          const undone = after.map((one) => ({
            ...one,
            fields: { ...one.fields, setupId: back.get(one.id) ?? one.fields.setupId },
          }));
          expect(undone).toEqual(before);
        },
      ),
    );
    const mend = setupMend([entry(1, START, id(7))], START, id(8));
    expect(mendToUndo(mend, [entry(1, START, id(9))])).toEqual([]);
  });
});

describe('a forgotten outing', () => {
  const outing = { startedAt: START, ended: null };

  it('should end at its last entry once four hours have gone by', () => {
    const last = START + 3_600_000;
    expect(forgottenSince(outing, [START + 1, last], last + FORGOTTEN_AFTER_MS - 1)).toBeNull();
    expect(forgottenSince(outing, [START + 1, last], last + FORGOTTEN_AFTER_MS)).toBe(last);
  });

  it('should end at its start when it has no entry, and not at all when it has ended', () => {
    expect(forgottenSince(outing, [], START + FORGOTTEN_AFTER_MS)).toBe(START);
    expect(forgottenSince({ ...outing, ended: { at: START + 1, by: 'hand' } }, [], START + 1e9)).toBeNull();
  });
});

describe('the start of an outing', () => {
  it('should make a valid outing and take each setup once', () => {
    const start = {
      siteId: id(1),
      setupIds: [id(2), id(3), id(2)],
      currentSetupId: id(3),
      targetListId: null,
    };
    const outing = outingFromStart(start, START);
    expect(outing.setupIds).toEqual([id(2), id(3)]);
    expect(outingSchema.safeParse(outing).success).toBe(true);
    expect(() => outingFromStart({ ...start, currentSetupId: id(9) }, START)).toThrow('current setup');
  });

  it('should make valid plain gear and a valid plain site', () => {
    expect(RECORD_SCHEMAS.receiver.safeParse(plainReceiver('My receiver')).success).toBe(true);
    expect(RECORD_SCHEMAS.antenna.safeParse(plainAntenna('Whip', 'whip')).success).toBe(true);
    expect(RECORD_SCHEMAS.setup.safeParse(plainSetup(id(1), id(2))).success).toBe(true);
    expect(RECORD_SCHEMAS.site.safeParse(plainSite('Here', { locator: 'JO46' }, 'rural')).success).toBe(true);
  });
});
