/** What the browser says of this site's storage; null where it does not say. */
export type StorageState = {
  /** True when the browser has promised not to clear it by itself. */
  readonly persisted: boolean | null;
  readonly usedBytes: number | null;
  readonly quotaBytes: number | null;
};

/** Asks the browser to keep the logbook; call it once there is something to keep. Safe to call again. */
export async function askToPersist(): Promise<boolean> {
  if (!('storage' in navigator) || typeof navigator.storage.persist !== 'function') return false;
  return (await navigator.storage.persisted()) || navigator.storage.persist();
}

export async function storageState(): Promise<StorageState> {
  if (!('storage' in navigator)) return { persisted: null, usedBytes: null, quotaBytes: null };
  const persisted =
    typeof navigator.storage.persisted === 'function' ? await navigator.storage.persisted() : null;
  const estimate = typeof navigator.storage.estimate === 'function' ? await navigator.storage.estimate() : {};
  return { persisted, usedBytes: estimate.usage ?? null, quotaBytes: estimate.quota ?? null };
}

/** Below this, new photos and sounds are refused first: entries need almost nothing. */
const LOW_BYTES = 50 * 1024 * 1024;

/** True when little room is left; false where the browser does not say. */
export function isStorageLow({ usedBytes, quotaBytes }: StorageState): boolean {
  return usedBytes !== null && quotaBytes !== null && quotaBytes - usedBytes < LOW_BYTES;
}
