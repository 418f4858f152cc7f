import { expect, it } from 'vitest';
import { rstOf } from './rst-parts';

it('should make no report of a figure that was not judged', () => {
  expect(rstOf({}, true)).toBeNull();
  expect(rstOf({ r: 5 }, true)).toBeNull();
  expect(rstOf({ s: 7, t: 9 }, true)).toBeNull();
  expect(rstOf({ r: 5, s: 7 }, true)).toEqual({ r: 5, s: 7 });
});

it('should keep the tone for telegraphy alone', () => {
  expect(rstOf({ r: 5, s: 7, t: 9 }, true)).toEqual({ r: 5, s: 7, t: 9 });
  expect(rstOf({ r: 5, s: 7, t: 9 }, false)).toEqual({ r: 5, s: 7 });
});
