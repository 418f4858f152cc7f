// @vitest-environment jsdom
import { beforeEach, describe, expect, it } from 'vitest';
import { RECORD_SCHEMAS } from '@harkmoor/sync-model/records/schemas';
import type { OpenLog } from '../../../store/open-log';
import { outingOnAPhone } from './outing-on-a-phone';
import { sharedPlaceOf } from './quick-start';

let log: OpenLog;

beforeEach(async () => {
  ({ log } = await outingOnAPhone());
});

describe('the first outing', () => {
  it('should make everything it needs at once, each record valid', async () => {
    for (const type of ['site', 'site-fix', 'receiver', 'antenna', 'setup', 'outing'] as const) {
      const records = await log.database.recordTable(type).toArray();
      expect(records).toHaveLength(1);
      expect(RECORD_SCHEMAS[type].safeParse(records[0]!.fields).error).toBeUndefined();
    }
  });

  it('should share a typed square no finer than its surroundings allow, and never finer than typed', () => {
    const typed = { kind: 'locator', locator: 'JO46ac', atMs: 0 } as const;
    expect(sharedPlaceOf(typed, 'rural')).toEqual({ locator: 'JO46ac' });
    expect(sharedPlaceOf(typed, 'city')).toEqual({ locator: 'JO46' });
    expect(sharedPlaceOf({ ...typed, locator: 'JO46' }, 'rural')).toEqual({ locator: 'JO46' });
  });

  it('should keep the exact fix in the person’s own log alone', async () => {
    const [fix] = await log.database.recordTable('site-fix').toArray();
    expect(fix!.clubId).toBe(log.myLogId);
    const [site] = await log.database.recordTable('site').toArray();
    expect(JSON.stringify(site)).not.toContain('latDeg');
  });
});
