import type { Mode } from '../../records/common-fields.js';
import { bandAt } from './bands.js';
import type { ItuRegion } from './region.js';

const VHF_FROM_HZ = 30_000_000;
/** Amateur voice is on the lower sideband below this, on the upper from here up. */
const SIDEBAND_CHANGE_HZ = 10_000_000;
/** The 60 m amateur band is the one below 10 MHz that is worked on the upper sideband. */
const UPPER_ON_60_M = '60 m';

/**
 * The mode that is most likely meant on a frequency, as a first choice that one tap changes (common practice, no
 * source): AM for broadcast and time stations, FM above 30 MHz, AM for aircraft there, sidebands for amateurs,
 * ships and aircraft below.
 */
export function usualMode(frequencyHz: number, region: ItuRegion): Mode {
  const band = bandAt(frequencyHz, region);
  const isVhf = frequencyHz >= VHF_FROM_HZ;
  switch (band?.service) {
    case 'amateur':
      if (isVhf) return 'FM';
      return frequencyHz < SIDEBAND_CHANGE_HZ && band.name !== UPPER_ON_60_M ? 'LSB' : 'USB';
    case 'aeronautical':
      return isVhf ? 'AM' : 'USB';
    case 'maritime':
      return isVhf ? 'FM' : 'USB';
    default:
      return isVhf ? 'FM' : 'AM';
  }
}
