import { describe, expect, it } from 'vitest';
import { hourDial } from './hour-dial.js';
import { anObservation, evenings } from './testing/invented-observation.js';

describe('hourDial', () => {
  it('should show each channel in each hour, lowest frequency first', () => {
    const rings = hourDial(
      [
        ...evenings(6, 3),
        ...evenings(2, 2, { hourUtc: 20 }),
        anObservation({ channelKey: '5000000', bandKey: '5 MHz standard frequency' }),
      ],
      'channels',
    );
    expect(rings.map(({ key, n }) => [key, n])).toEqual([
      ['5000000', 1],
      ['6070000', 8],
    ]);
    const cells = rings[1]!.cells;
    expect(cells).toHaveLength(24);
    expect(cells[19]).toMatchObject({ hourUtc: 19, heard: 3, n: 6, rate: 0.5, isThin: false });
    expect(cells[20]).toMatchObject({ hourUtc: 20, heard: 2, n: 2, rate: 1, isThin: true });
    expect(cells[3]).toMatchObject({ n: 0, rate: null, reason: 'nothing-tried' });
  });

  it('should give a band a rate in an hour from three channels of five only', () => {
    const three = ['5900000', '6000000', '6070000'].flatMap((channelKey, i) =>
      evenings(5, i, { channelKey }),
    );
    const [ring] = hourDial([...three, ...evenings(5, 5, { hourUtc: 20 })], 'bands');
    expect(ring!.key).toBe('49 m broadcast');
    expect(ring!.cells[19]!.rate).toBeCloseTo((0 + 0.2 + 0.4) / 3, 12);
    expect(ring!.cells[20]).toMatchObject({ n: 5, rate: null, reason: 'too-few-channels' });
  });

  it('should keep a signal outside every band out of the rings of bands', () => {
    expect(hourDial([anObservation({ bandKey: null })], 'bands')).toEqual([]);
  });
});
