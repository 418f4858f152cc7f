import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { CHECK_REACH_MS, clockIndex, correctedAt, correctedBy } from './corrected-time.js';

const HOUR_MS = 3_600_000;
const NOON = Date.UTC(2026, 10, 12, 12);

const check = (deviceAt: number, offsetMs: number, deviceId = 'pebble01', uncertaintyMs = 200) => ({
  deviceId,
  deviceAt,
  offsetMs,
  uncertaintyMs,
});
const noon = { deviceAt: NOON, deviceId: 'pebble01' };

describe('correctedAt', () => {
  it('should lie on the line between the check before and the one after', () => {
    const checks = [check(NOON - HOUR_MS, 1000), check(NOON + 3 * HOUR_MS, 5000)];
    expect(correctedAt(noon, checks, [])).toEqual({ atMs: NOON + 2000, basis: 'between', offsetMs: 2000 });
  });

  it('should take the nearest check where all stand on one side', () => {
    const checks = [check(NOON - 5 * HOUR_MS, 9000), check(NOON - HOUR_MS, 1000)];
    expect(correctedAt(noon, checks, [])).toEqual({ atMs: NOON + 1000, basis: 'nearest', offsetMs: 1000 });
  });

  it('should keep the raw time, marked, where no check reaches it', () => {
    const checks = [check(NOON - CHECK_REACH_MS - 1, 1000), check(NOON, 7000, 'moss0002')];
    expect(correctedAt(noon, checks, [])).toEqual({ atMs: NOON, basis: 'unchecked', offsetMs: 0 });
  });

  it('should still use a check exactly 12 h away', () => {
    expect(correctedAt(noon, [check(NOON - CHECK_REACH_MS, 1000)], []).basis).toBe('nearest');
  });

  it('should not reach across a step of the clock', () => {
    const checks = [check(NOON - HOUR_MS, 1000), check(NOON + HOUR_MS, 180_000)];
    const step = { deviceId: 'pebble01', at: NOON + 1 };
    expect(correctedAt(noon, checks, [step])).toEqual({
      atMs: NOON + 1000,
      basis: 'nearest',
      offsetMs: 1000,
    });
    expect(correctedAt(noon, [checks[1]!], [step]).basis).toBe('unchecked');
    expect(correctedAt(noon, checks, [{ ...step, deviceId: 'moss0002' }]).basis).toBe('between');
  });

  it('should use a check made at the moment a step was seen for what came after, not before', () => {
    const checks = [check(NOON, 180_000)];
    const steps = [{ deviceId: 'pebble01', at: NOON }];
    expect(correctedAt({ ...noon, deviceAt: NOON + 60_000 }, checks, steps).offsetMs).toBe(180_000);
    expect(correctedAt({ ...noon, deviceAt: NOON - 60_000 }, checks, steps).basis).toBe('unchecked');
  });

  it('should pass over a deleted check', () => {
    expect(correctedAt(noon, [{ ...check(NOON, 1000), deleted: true }], []).basis).toBe('unchecked');
  });

  it('should bring a phone ten years fast back to the year of the outing', () => {
    const tenYearsMs = 10 * 365 * 86_400_000;
    const fast = { deviceAt: NOON + tenYearsMs, deviceId: 'pebble01' };
    expect(correctedAt(fast, [check(fast.deviceAt - HOUR_MS, -tenYearsMs)], []).atMs).toBe(NOON);
  });
});

describe('correctedBy', () => {
  const aTime = fc.integer({ min: 0, max: 40 }).map((hours) => NOON + hours * HOUR_MS);
  const aDevice = fc.constantFrom('pebble01', 'moss0002');
  const someChecks = fc.array(
    fc
      .tuple(aTime, fc.integer({ min: -9000, max: 9000 }), aDevice, fc.integer({ min: 0, max: 3 }))
      .map((parts) => check(...parts)),
    { maxLength: 8 },
  );
  const someSteps = fc.array(fc.record({ deviceId: aDevice, at: aTime }), { maxLength: 3 });

  it('should equal the search through all checks one by one, whatever their order', () => {
    fc.assert(
      fc.property(someChecks, someSteps, aTime, aDevice, (checks, steps, deviceAt, deviceId) => {
        const found = correctedBy(clockIndex([...checks].reverse(), steps), { deviceAt, deviceId });
        const usable = checks.filter(
          (one) =>
            one.deviceId === deviceId &&
            Math.abs(one.deviceAt - deviceAt) <= 12 * HOUR_MS &&
            !steps.some(
              (step) =>
                step.deviceId === deviceId &&
                step.at > Math.min(one.deviceAt, deviceAt) &&
                step.at <= Math.max(one.deviceAt, deviceAt),
            ),
        );
        const hasBefore = usable.some((one) => one.deviceAt <= deviceAt);
        const hasAfter = usable.some((one) => one.deviceAt > deviceAt);
        expect(found.basis).toBe(
          hasBefore && hasAfter ? 'between' : hasBefore || hasAfter ? 'nearest' : 'unchecked',
        );
        const offsets = usable.map((one) => one.offsetMs);
        if (offsets.length > 0) {
          expect(found.offsetMs).toBeGreaterThanOrEqual(Math.min(...offsets));
          expect(found.offsetMs).toBeLessThanOrEqual(Math.max(...offsets));
        }
        expect(found.atMs).toBe(deviceAt + found.offsetMs);
        expect(correctedAt({ deviceAt, deviceId }, checks, steps)).toEqual(found);
      }),
    );
  });
});
