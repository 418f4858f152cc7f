/**
 * Files that a feature shows to the others besides its module and the classes that the module exports: decorators, entities
 * and types, which a Nest module cannot export. Each is a promise to the other features; keep the lists short.
 */
export const API_DOORS = {
  // what a feature needs to describe and register its record types, and to ask for its changes
  sync: [
    'column-types.ts',
    'feed.ts',
    'history.row.ts',
    'record-table.ts',
    'sql-session.ts',
    'sync-features.ts',
  ],
  mail: ['outgoing-mail.entity.ts'],
};
