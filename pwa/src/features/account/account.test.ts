import { describe, expect, it } from 'vitest';
import { initialsOf } from './AccountBadge';
import { answerWords } from '../../platform/api/answer-words';
import { linkToken } from './link-token';

describe('initials', () => {
  it.each([
    ['Marthe Rødklit', 'MR'],
    ['Øystein', 'ØY'],
    ['Anna Maria Lind', 'AL'],
    ['x', 'X'],
  ])('should make of %s the letters %s', (name, letters) => {
    expect(initialsOf(name)).toBe(letters);
  });
});

describe('the link of a mail', () => {
  it('should give its token only from behind the #', () => {
    expect(linkToken('#token=abc-123_x')).toBe('abc-123_x');
    expect(linkToken('')).toBeNull();
  });
});

describe('an answer in words', () => {
  it('should say that logging goes on when the server is out of reach', () => {
    expect(answerWords({ kind: 'unreachable' })).toContain('logging does not');
    expect(answerWords({ kind: 'throttled', retryAfterMs: 4200 })).toContain('5 seconds');
  });
});
