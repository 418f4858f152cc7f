import { stampOf } from '../merge/record-state.js';
import { parentsOf } from '../records/record-types.js';
import type { CheckedChange } from './check-change.js';
import type { HubKey, HubWrite, ReplacedKey } from './ports.js';
import { keyText, WorkingSet } from './working-set.js';

/** Reads all that the changes touch, name or need for a decision: at most three questions to the store. */
export async function readWorkingSet(tx: HubWrite, changes: readonly CheckedChange[]): Promise<WorkingSet> {
  const set = new WorkingSet();
  await addRecords(
    tx,
    set,
    changes.flatMap(({ key, state }) => [...parentsOf(key.type, state.fields), key]),
  );
  await addRecords(tx, set, listsOfStoredTargets(set, changes));
  const values = valuesToAskFor(set, changes);
  if (values.length > 0) set.addReplaced(await tx.replacedBefore(values));
  return set;
}

async function addRecords(tx: HubWrite, set: WorkingSet, keys: readonly HubKey[]): Promise<void> {
  const wanted = new Map(keys.map(({ type, id }) => [keyText({ type, id }), { type, id }]));
  const missing = [...wanted.values()].filter((key) => !set.has(key));
  if (missing.length > 0) set.addRead(missing, await tx.records(missing));
}

/** A change of a stored target need not name its list, whose state decides who may write it. */
function listsOfStoredTargets(set: WorkingSet, changes: readonly CheckedChange[]): HubKey[] {
  return changes.flatMap(({ key }) => {
    const stored = key.type === 'target' ? set.record(key) : undefined;
    return stored ? parentsOf('target', stored.fields) : [];
  });
}

/** Values that are not, or may at their turn no longer be, the latest: the history may hold them already. */
function valuesToAskFor(set: WorkingSet, changes: readonly CheckedChange[]): ReplacedKey[] {
  const times = new Map<string, number>();
  for (const { key } of changes) times.set(keyText(key), (times.get(keyText(key)) ?? 0) + 1);
  return changes.flatMap(({ key, state }) => {
    const stored = set.record(key);
    if (!stored) return [];
    const isRepeated = times.get(keyText(key))! > 1;
    return Object.keys(state.fields)
      .filter((field) => field in stored.fields)
      .map((field) => ({ ...key, field, stamp: stampOf(state, field) }))
      .filter(
        ({ field, stamp }) =>
          stamp < stampOf(stored, field) || (isRepeated && stamp !== stampOf(stored, field)),
      );
  });
}
