import type { Rst } from '@harkmoor/sync-model/records/reception';

/** The figures of an RST as they were touched; one that was not judged is absent. */
export type RstParts = Partial<Rst>;

/**
 * The report that the touched figures make, null while readability or strength is missing: a figure that nobody judged
 * is never filled in. The tone belongs to telegraphy, and may be left out there too.
 */
export function rstOf({ r, s, t }: RstParts, hasTone: boolean): Rst | null {
  if (r === undefined || s === undefined) return null;
  return hasTone && t !== undefined ? { r, s, t } : { r, s };
}
