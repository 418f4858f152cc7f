import { stampOf } from '@harkmoor/sync-model/merge/record-state';
import type { StoredRecord } from '@harkmoor/sync-model/device/stored-record';
import type { Stamp } from '@harkmoor/sync-model/stamp/stamp';
import type { Device } from './browser';

/** The stamp that a field of the only reception on a device has, read from where the application keeps it. */
export async function storedStamp({ page }: Device, field: string): Promise<Stamp> {
  const receptions = (await page.evaluate(readReceptions)) as StoredRecord<'reception'>[];
  const [only] = receptions;
  if (!only || receptions.length > 1) throw new Error(`there are ${receptions.length} receptions, not one`);
  return stampOf(only, field);
}

/** Runs in the page. */
async function readReceptions(): Promise<unknown[]> {
  const databases = await indexedDB.databases();
  const name = databases.map((each) => each.name ?? '').find((each) => /^harkmoor-[0-9a-f]{8}-/.test(each));
  if (!name) throw new Error('this device holds no log of an account');
  const database = await new Promise<IDBDatabase>((resolve, reject) => {
    const request = indexedDB.open(name);
    request.onsuccess = () => resolve(request.result);
    request.onerror = () => reject(request.error ?? new Error('the log did not open'));
  });
  try {
    return await new Promise((resolve, reject) => {
      const request = database.transaction('reception').objectStore('reception').getAll();
      request.onsuccess = () => resolve(request.result);
      request.onerror = () => reject(request.error ?? new Error('the receptions could not be read'));
    });
  } finally {
    database.close();
  }
}
