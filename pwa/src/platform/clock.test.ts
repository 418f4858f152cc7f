import { expect, test } from 'vitest';
import { createStepDetector } from './clock';

function clocks() {
  const at = { wall: 1_000_000, steady: 50 };
  const detector = createStepDetector(
    () => at.wall,
    () => at.steady,
  );
  const pass = (wallMs: number, steadyMs: number): void => {
    at.wall += wallMs;
    at.steady += steadyMs;
  };
  return { detector, pass };
}

test('should see no step while both clocks run alike', () => {
  const { detector, pass } = clocks();
  pass(3_600_000, 3_600_300);
  expect(detector.look()).toBeNull();
});

test('should see a step back and a step forward, each once', () => {
  const { detector, pass } = clocks();
  pass(1000 - 180_000, 1000);
  expect(detector.look()?.stepMs).toBe(-180_000);
  pass(1000, 1000);
  expect(detector.look()).toBeNull();
  pass(61_000, 1000);
  expect(detector.look()?.stepMs).toBe(60_000);
});

test('should not take the sleep of the device for a step forward, but see a step back through it', () => {
  const { detector, pass } = clocks();
  pass(600_000, 10);
  expect(detector.look(true)).toBeNull();
  pass(-600_000, 10);
  expect(detector.look(true)?.stepMs).toBeLessThan(-500_000);
});
