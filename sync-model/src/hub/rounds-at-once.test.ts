import { describe, expect, it } from 'vitest';
import { MemoryHub } from '../../simulation/memory-hub.js';
import { ANNA, CLUB, idOf, startClubs } from '../../simulation/people.js';
import { randomFrom } from '../../simulation/random.js';
import { SAMPLES } from '../../simulation/sample-fields.js';
import { Scheduler, settled } from '../../simulation/scheduler.js';
import type { Change } from '../protocol/messages.js';
import { formatStamp } from '../stamp/stamp.js';
import { answerRound } from './answer-round.js';

const NOW_MS = Date.UTC(2026, 5, 1);
const SITE = idOf(1);
const stamp = (deviceId: string, counter: number) => formatStamp({ wallMs: NOW_MS, counter, deviceId });

describe('two rounds at once on different fields of one record', () => {
  it('should both survive, 1 000 times in any interleaving', async () => {
    const interleavings = new Set<string>();
    let waits = 0;
    for (let seed = 1; seed <= 1000; seed += 1) {
      const scheduler = new Scheduler(randomFrom(seed));
      const hub = new MemoryHub(scheduler, () => {}, { name: 'hub', isDead: false });
      for (const club of startClubs()) hub.put(club);
      const ports = { store: hub, nowMs: () => NOW_MS, newId: () => idOf(2) };
      const ask = (deviceId: string, change: Change) => {
        const clubs = [{ clubId: CLUB, historyId: null, cursor: 0, changes: [change] }];
        return answerRound(ports, { accountId: ANNA }, { protocol: 1, deviceId, sentAt: NOW_MS, clubs });
      };
      const run = async (rounds: Promise<unknown>[]) => {
        await settled();
        while (scheduler.waiting > 0) await scheduler.runOne();
        await Promise.all(rounds);
      };
      const at = stamp('phonea01', 0);
      await run([ask('phonea01', { type: 'site', id: SITE, at, fields: SAMPLES.site('x') })]);
      const edit = (deviceId: string, field: string): Change => ({
        type: 'site',
        id: SITE,
        at: stamp(deviceId, 1),
        fields: { [field]: deviceId },
        base: { [field]: at },
      });
      await run([ask('phonea01', edit('phonea01', 'name')), ask('phonea02', edit('phonea02', 'notes'))]);
      expect(hub.clubs.get(CLUB)!.records.get(`site/${SITE}`)).toMatchObject({
        seq: 3,
        fields: { name: 'phonea01', notes: 'phonea02' },
      });
      interleavings.add(scheduler.traceHash);
      waits += hub.waits;
    }
    expect(interleavings.size).toBeGreaterThan(100);
    expect(waits).toBeGreaterThan(100);
  });
});
