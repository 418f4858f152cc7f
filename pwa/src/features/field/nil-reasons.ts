import type { NilReason } from '@harkmoor/sync-model/records/reception-from-tap';

/** In the order of how often they are meant; the schema, which knows them too, stays out of the first chunk. */
export const NIL_REASONS_IN_ORDER: readonly NilReason[] = ['nothing', 'covered', 'noise', 'fault'];
