import { describe, expect, it } from 'vitest';
import { figureText } from './figure-text.js';

describe('a figure as text', () => {
  it('should carry a true minus and a thin space before the unit', () => {
    expect(figureText(-85, 1, 'dBm')).toBe('\u221285\u2009dBm');
  });

  it('should drop trailing zeros and keep those of the whole number', () => {
    expect(figureText(100, 2)).toBe('100');
    expect(figureText(7.5, 3)).toBe('7.5');
    expect(figureText(7.05, 2)).toBe('7.05');
  });

  it('should not show a minus before nought', () => {
    expect(figureText(-0.001, 1)).toBe('0');
  });
});
