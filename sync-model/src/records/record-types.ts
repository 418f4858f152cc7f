/**
 * The names of all record types, in the order in which they are sent: a parent stands before everything
 * that refers to it. Nothing here needs zod, so the phone's first chunk may import it.
 */
export const WRITABLE_TYPES = [
  'site',
  'site-fix',
  'receiver',
  'antenna',
  'setup',
  'target-list',
  'target',
  'outing',
  'swap-test',
  'reception',
  'clock-check',
  'dial-check',
  'noise-reading',
  'attachment',
] as const;

/** Written by the server alone; a phone pulls them and never sends them. */
export const SERVER_TYPES = ['member', 'event', 'event-result', 'review', 'history'] as const;

export type WritableType = (typeof WRITABLE_TYPES)[number];
export type ServerType = (typeof SERVER_TYPES)[number];
export type RecordType = WritableType | ServerType;

export function isWritableType(type: string): type is WritableType {
  return (WRITABLE_TYPES as readonly string[]).includes(type);
}

export function isRecordType(type: string): type is RecordType {
  return isWritableType(type) || (SERVER_TYPES as readonly string[]).includes(type);
}

/** Position in the sending order; parents have the smaller number. */
export function sendingOrder(type: WritableType): number {
  return WRITABLE_TYPES.indexOf(type);
}

/** A field that names another record of the same club: `many` fields hold a list of ids. */
export type ParentField = { readonly field: string; readonly type: WritableType; readonly many?: true };

/**
 * The records that must be known to the server before a record is accepted. `replaces` is no parent: it
 * points back in time and nothing is computed through it.
 */
export const PARENT_FIELDS: Readonly<Record<WritableType, readonly ParentField[]>> = {
  site: [],
  'site-fix': [],
  receiver: [],
  antenna: [],
  setup: [
    { field: 'receiverId', type: 'receiver' },
    { field: 'antennaId', type: 'antenna' },
  ],
  'target-list': [],
  target: [{ field: 'listId', type: 'target-list' }],
  outing: [
    { field: 'siteId', type: 'site' },
    { field: 'targetListId', type: 'target-list' },
    { field: 'setupIds', type: 'setup', many: true },
    { field: 'currentSetupId', type: 'setup' },
  ],
  'swap-test': [
    { field: 'outingId', type: 'outing' },
    { field: 'setupIds', type: 'setup', many: true },
    { field: 'targetId', type: 'target' },
  ],
  reception: [
    { field: 'outingId', type: 'outing' },
    { field: 'siteId', type: 'site' },
    { field: 'setupId', type: 'setup' },
    { field: 'targetId', type: 'target' },
  ],
  'clock-check': [],
  'dial-check': [{ field: 'receiverId', type: 'receiver' }],
  'noise-reading': [
    { field: 'siteId', type: 'site' },
    { field: 'setupId', type: 'setup' },
  ],
  attachment: [{ field: 'receptionId', type: 'reception' }],
};

/** Types that are retired, never deleted, once anything refers to them. */
export const RETIRABLE_TYPES: readonly WritableType[] = ['site', 'receiver', 'antenna', 'setup'];

/** The ids of the parents that a record's fields name, with their types; null and absent fields name none. */
export function parentsOf(
  type: WritableType,
  fields: Readonly<Record<string, unknown>>,
): { type: WritableType; id: string }[] {
  const parents: { type: WritableType; id: string }[] = [];
  for (const { field, type: parentType, many } of PARENT_FIELDS[type]) {
    const value: unknown = fields[field];
    const ids: readonly unknown[] = many && Array.isArray(value) ? value : [many ? null : value];
    for (const id of ids) if (typeof id === 'string') parents.push({ type: parentType, id });
  }
  return parents;
}
