import type { Antenna } from './antenna.js';
import type { Receiver } from './receiver.js';
import type { Setup } from './setup.js';
import type { Place, Site } from './site.js';

/** S9 below 30 MHz and the width of an S-unit, IARU Region 1 Technical Recommendation R.1. */
const R1_SCALE = { kind: 's', s9Dbm: -73, dbPerS: 6, calibrated: false } as const;

/** A receiver of which only its name is known: an S-meter by the book, not calibrated, no stated range. */
export function plainReceiver(name: string): Receiver {
  return {
    deleted: false,
    importId: null,
    name,
    ranges: [],
    meterScale: R1_SCALE,
    ifHz: null,
    bandwidthsHz: null,
    supplyMa: null,
    batteryMah: null,
    dialStepHz: null,
    sharedUse: false,
    replaces: null,
    notes: null,
    retiredAt: null,
  };
}

export function plainAntenna(name: string, kind: Antenna['kind']): Antenna {
  return {
    deleted: false,
    importId: null,
    name,
    kind,
    lengthM: null,
    heightM: null,
    azimuthDeg: null,
    gainDb: null,
    sharedUse: false,
    replaces: null,
    notes: null,
    retiredAt: null,
  };
}

/** A receiver with an antenna and nothing between them. */
export function plainSetup(receiverId: string, antennaId: string): Setup {
  return {
    deleted: false,
    importId: null,
    receiverId,
    antennaId,
    coupling: null,
    attenuationDb: 0,
    preampDb: 0,
    retiredAt: null,
  };
}

export function plainSite(name: string, place: Place, environment: Site['environment']): Site {
  return {
    deleted: false,
    importId: null,
    name,
    place,
    environment,
    sharedUse: false,
    notes: null,
    retiredAt: null,
  };
}
