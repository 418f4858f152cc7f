import { matchPath } from 'react-router-dom';
import { describe, expect, test } from 'vitest';
import { PATTERNS, paths, sectionOf } from './paths';

/** The pattern that the router would choose for an address. */
function patternsOf(address: string): string[] {
  const pathname = new URL(address, 'http://phone').pathname;
  return Object.values(PATTERNS).filter((pattern) => matchPath(pattern, pathname) !== null);
}

describe('the addresses', () => {
  test('should each be answered by a screen', () => {
    const built = Object.values(paths).map((build) => (build as (...parts: unknown[]) => string)('x y/z'));
    for (const address of built) expect(patternsOf(address), address).not.toEqual([]);
  });

  test('should keep what stands in an id out of the path', () => {
    expect(matchPath(PATTERNS.site, paths.site('a/b'))?.params.id).toBe('a/b');
  });

  test('should leave out of the query what is empty', () => {
    expect(paths.logbook({ band: '49m', text: '', site: null })).toBe('/logbook?band=49m');
    expect(paths.logbook()).toBe('/logbook');
  });

  test('should light the tab that an address belongs to', () => {
    expect(['/field/pad', '/logbook/1', '/desk/people', '/sync'].map(sectionOf)).toEqual([
      'field',
      'logbook',
      'desk',
      null,
    ]);
  });
});
