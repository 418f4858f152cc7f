import { describe, expect, it } from 'vitest';
import { ROLES, type Role } from '../records/member.js';
import { WRITABLE_TYPES, type WritableType } from '../records/record-types.js';
import { writeRefusal, type Write } from './write-refusal.js';

const ME = 'me';
const OTHER = 'other';
const DRAFT = { ownerId: ME, publishedAt: null };
const OTHERS_DRAFT = { ownerId: OTHER, publishedAt: null };
const PUBLISHED = { ownerId: OTHER, publishedAt: 1_700_000_000_000 };

function may(role: Role, write: Write, clubKind: 'club' | 'my-log' = 'club'): boolean {
  return writeRefusal({ accountId: ME, role, clubKind }, write) === null;
}

const OWNED_TYPES = WRITABLE_TYPES.filter(
  (type) => type !== 'target-list' && type !== 'target' && type !== 'site-fix',
);

describe('who may write', () => {
  it.each(OWNED_TYPES.flatMap((type) => ROLES.map((role) => [role, type] as const)))(
    'should let a %s make a %s and change an own one, and nobody else change it',
    (role, type) => {
      expect(may(role, { type, ownerId: null, changed: {} })).toBe(true);
      expect(may(role, { type, ownerId: ME, changed: {} })).toBe(true);
      expect(may(role, { type, ownerId: OTHER, changed: {} })).toBe(false);
    },
  );

  it.each(ROLES)('should keep exact positions out of a club, for a %s too', (role) => {
    expect(may(role, { type: 'site-fix', ownerId: null, changed: {} })).toBe(false);
    expect(may(role, { type: 'site-fix', ownerId: null, changed: {} }, 'my-log')).toBe(true);
  });

  /** records.md: a draft is its owner's, a published list the organizers'. */
  const TABLE: [string, Write, Record<Role, boolean>][] = [
    ['make a list', list(null, {}), all(true)],
    ['make a list that is published at once', list(null, { publishedAt: 1 }), organizers()],
    ['change an own draft', list(ME, { name: 'x' }, DRAFT), all(true)],
    ["change another's draft", list(OTHER, { name: 'x' }, OTHERS_DRAFT), all(false)],
    ['publish an own draft', list(ME, { publishedAt: 1 }, DRAFT), organizers()],
    ["publish another's draft", list(OTHER, { publishedAt: 1 }, OTHERS_DRAFT), all(false)],
    ['change a published list', list(OTHER, { name: 'x' }, PUBLISHED), organizers()],
    ['withdraw a published list', list(OTHER, { publishedAt: null }, PUBLISHED), organizers()],
    ['add a target to an own draft', target(null, DRAFT), all(true)],
    ["add a target to another's draft", target(null, OTHERS_DRAFT), all(false)],
    ['add a target to a published list', target(null, PUBLISHED), organizers()],
    ['change an own target of a published list', target(ME, PUBLISHED), organizers()],
    ["change another's target of a published list", target(OTHER, PUBLISHED), organizers()],
    ['change a target of an own draft', target(ME, DRAFT), all(true)],
  ];

  it.each(
    TABLE.flatMap(([what, write, answers]) =>
      ROLES.map((role) => [role, what, write, answers[role]] as const),
    ),
  )('should decide for a %s: %s', (role, _what, write, answer) => {
    expect(may(role, write)).toBe(answer);
  });

  it('should say why not in a sentence', () => {
    const refusal = writeRefusal(
      { accountId: ME, role: 'admin', clubKind: 'club' },
      { type: 'reception', ownerId: OTHER, changed: {} },
    );
    expect(refusal).toEqual({ code: 'forbidden', message: 'Only its owner may change this record.' });
  });

  it('should let anybody publish in their own log', () => {
    expect(may('member', list(ME, { publishedAt: 1 }, DRAFT), 'my-log')).toBe(true);
  });
});

function list(ownerId: string | null, changed: Write['changed'], stored?: Write['list']): Write {
  return write('target-list', ownerId, changed, stored);
}

function target(ownerId: string | null, stored: Write['list']): Write {
  return write('target', ownerId, { name: 'x' }, stored);
}

function write(
  type: WritableType,
  ownerId: string | null,
  changed: Write['changed'],
  stored: Write['list'],
): Write {
  return { type, ownerId, changed, ...(stored ? { list: stored } : {}) };
}

function all(answer: boolean): Record<Role, boolean> {
  return { member: answer, organizer: answer, admin: answer };
}

function organizers(): Record<Role, boolean> {
  return { member: false, organizer: true, admin: true };
}
