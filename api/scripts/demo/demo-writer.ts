import type { Change } from '@harkmoor/sync-model/protocol/messages';
import type { FieldsByType } from '@harkmoor/sync-model/records/schemas';
import type { WritableType } from '@harkmoor/sync-model/records/record-types';
import { formatStamp } from '@harkmoor/sync-model/stamp/stamp';
import { v7 as uuidv7 } from 'uuid';
import type { DemoPerson } from './demo-people.js';
import type { SeededRandom } from './seeded-random.js';

/** One record as a phone of the club would send it, and whether to the club or to the person's My log. */
export type DemoChange = { person: string; log: 'club' | 'my-log'; change: Change };

export type DemoWriter = {
  readonly changes: DemoChange[];
  /** A new record of `person`, made at the true time `at`; returns its id. `id` names a site's fix. */
  add<T extends WritableType>(
    person: DemoPerson,
    type: T,
    at: number,
    fields: Omit<FieldsByType[T], 'deleted' | 'importId'>,
    place?: { log?: 'club' | 'my-log'; id?: string },
  ): string;
};

/** Collects changes with ids and stamps that are the same at every run of the same seed. */
export function createDemoWriter(random: SeededRandom): DemoWriter {
  const changes: DemoChange[] = [];
  let counter = 0;
  return {
    changes,
    add: (person, type, at, fields, place = {}) => {
      const id = place.id ?? uuidv7({ msecs: at, random: random.bytes(16) });
      counter = (counter + 1) % 0xffff;
      const stamp = formatStamp({ wallMs: at, counter, deviceId: person.deviceId });
      const whole = { deleted: false, importId: null, ...fields };
      changes.push({
        person: person.key,
        log: place.log ?? 'club',
        change: { type, id, at: stamp, fields: whole },
      });
      return id;
    },
  };
}
