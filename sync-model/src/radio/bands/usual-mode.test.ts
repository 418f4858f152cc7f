import { expect, it } from 'vitest';
import { usualMode } from './usual-mode.js';

// common practice, no source
it.each([
  [6_070_000, 'AM', '49 m broadcast'],
  [5_000_000, 'AM', 'a time station'],
  [7_090_000, 'LSB', '40 m amateur'],
  [5_354_000, 'USB', '60 m amateur'],
  [14_200_000, 'USB', '20 m amateur'],
  [145_500_000, 'FM', '2 m amateur'],
  [8_891_000, 'USB', 'aircraft on HF'],
  [4_125_000, 'USB', 'ships on HF'],
  [98_500_000, 'FM', 'VHF broadcast'],
  [3_330_500, 'AM', '90 m broadcast'],
] as const)('should offer for %i Hz the mode %s (%s)', (frequencyHz, mode, _what) => {
  expect(usualMode(frequencyHz, 1)).toBe(mode);
});
