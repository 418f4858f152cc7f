import type { ItuRegion } from './region.js';

/** What a band is for, in the words of the Radio Regulations. */
export type BandService = 'broadcast' | 'amateur' | 'maritime' | 'aeronautical' | 'standard frequency';

/** One row: the edges in kHz, upper one excluded, in the regions named. */
export type BandRow = {
  name: string;
  service: BandService;
  lowKhz: number;
  highKhz: number;
  regions: readonly ItuRegion[];
};

/** Allocations change at each world radio conference: what this table was made from. */
export const BAND_TABLE_EDITION =
  'Radio Regulations Article 5, edition of 2020; IARU Region 1 HF band plan of 16 October 2020';

const ALL: readonly ItuRegion[] = [1, 2, 3];

function rows(service: BandService, ...list: [string, number, number, (readonly ItuRegion[])?][]): BandRow[] {
  return list.map(([name, lowKhz, highKhz, regions = ALL]) => ({ name, service, lowKhz, highKhz, regions }));
}

/*
 * Sources by letter. A: a Region 1 national frequency table after Article 5 of the Radio Regulations, 2026.
 * B: the wiki of IARU Region 1 quoting the Regulations (WRC-15). C: the IARU Region 1 HF band plan.
 * E: a spectrum wiki quoting Nos. 5.134 and 5.142 (WRC-07). M: from memory of the edition of 2020.
 * Names in metres are custom, not regulation.
 */

/** LW and MW: GE75 plan and A; Region 2 MW 535–1 705 in a US table; LW edges M. */
const MEDIUM_WAVE = rows(
  'broadcast',
  ['LW', 148.5, 283.5, [1]],
  ['MW', 526.5, 1606.5, [1, 3]],
  ['MW', 535, 1705, [2]],
);

/** A, but 120 m, 90 m and 60 m below 4 850 kHz (tropical bands, No. 5.113) M; 75 m A and B; 41 m in Region 2 E. */
const SHORT_WAVE = rows(
  'broadcast',
  ['120 m', 2300, 2498, [1]],
  ['120 m', 2300, 2495, [2, 3]],
  ['90 m', 3200, 3400],
  ['75 m', 3950, 4000, [1]],
  ['75 m', 3900, 4000, [3]],
  ['60 m', 4750, 4995],
  ['60 m', 5005, 5060],
  ['49 m', 5900, 6200],
  ['41 m', 7200, 7450, [1, 3]],
  ['41 m', 7300, 7400, [2]],
  ['31 m', 9400, 9900],
  ['25 m', 11_600, 12_100],
  ['22 m', 13_570, 13_870],
  ['19 m', 15_100, 15_800],
  ['16 m', 17_480, 17_900],
  ['15 m', 18_900, 19_020],
  ['13 m', 21_450, 21_850],
  ['11 m', 25_670, 26_100],
);

/** Region 1 A; Regions 2 and 3 M. */
const VHF_BROADCAST = rows(
  'broadcast',
  ['VHF FM', 87_500, 108_000, [1]],
  ['VHF FM', 88_000, 108_000, [2]],
  ['VHF FM', 87_000, 108_000, [3]],
);

/** Common edges. A and C; 80 m B; 40 m A and E; 160 m in Regions 2 and 3 a magazine's extract of 2001;
 * 6 m and 2 m A and M. Where countries differ (160 m above 1 850 kHz and 6 m above 52 MHz in Region 1), the wider edge: an
 * amateur signal met there is one. */
const AMATEUR = rows(
  'amateur',
  ['2200 m', 135.7, 137.8],
  ['630 m', 472, 479],
  ['160 m', 1810, 2000, [1]],
  ['160 m', 1800, 2000, [2, 3]],
  ['80 m', 3500, 3800, [1]],
  ['80 m', 3500, 4000, [2]],
  ['80 m', 3500, 3900, [3]],
  ['60 m', 5351.5, 5366.5],
  ['40 m', 7000, 7200, [1, 3]],
  ['40 m', 7000, 7300, [2]],
  ['30 m', 10_100, 10_150],
  ['20 m', 14_000, 14_350],
  ['17 m', 18_068, 18_168],
  ['15 m', 21_000, 21_450],
  ['12 m', 24_890, 24_990],
  ['10 m', 28_000, 29_700],
  ['6 m', 50_000, 54_000],
  ['2 m', 144_000, 146_000, [1]],
  ['2 m', 144_000, 148_000, [2, 3]],
);

/** A, with the narrow bands beside them; 20 MHz, 20 kHz and the 2 495 kHz of Regions 2 and 3 M. */
const STANDARD_FREQUENCY = rows(
  'standard frequency',
  ['20 kHz', 19.95, 20.05],
  ['2.5 MHz', 2498, 2502, [1]],
  ['2.5 MHz', 2495, 2502, [2, 3]],
  ['5 MHz', 4995, 5005],
  ['10 MHz', 9995, 10_005],
  ['15 MHz', 14_990, 15_010],
  ['20 MHz', 19_990, 20_010],
  ['25 MHz', 24_990, 25_010],
);

/** A; the two channels of navigational warnings (490 and 518 kHz) M. */
const MARITIME = rows(
  'maritime',
  ['490 kHz', 489.5, 490.5],
  ['518 kHz', 517.5, 518.5],
  ['2 MHz', 2173.5, 2190.5],
  ['4 MHz', 4063, 4438],
  ['6 MHz', 6200, 6525],
  ['8 MHz', 8195, 8815],
  ['12 MHz', 12_230, 13_200],
  ['16 MHz', 16_360, 17_410],
  ['18 MHz', 18_780, 18_900],
  ['19 MHz', 19_680, 19_800],
  ['22 MHz', 22_000, 22_855],
  ['25 MHz', 25_070, 25_210],
  ['26 MHz', 26_100, 26_175],
  ['VHF', 156_000, 157_400],
  ['VHF', 160_600, 162_000],
);

/** A: the route (R) and off-route (OR) bands, neighbours joined. */
const AERONAUTICAL = rows(
  'aeronautical',
  ['3 MHz', 2850, 3155],
  ['3.4 MHz', 3400, 3500],
  ['4.7 MHz', 4650, 4750],
  ['5.6 MHz', 5480, 5680],
  ['6.6 MHz', 6525, 6765],
  ['8.9 MHz', 8815, 9040],
  ['10 MHz', 10_005, 10_100],
  ['11.3 MHz', 11_175, 11_400],
  ['13.3 MHz', 13_200, 13_360],
  ['15 MHz', 15_010, 15_100],
  ['18 MHz', 17_900, 18_030],
  ['22 MHz', 21_924, 22_000],
  ['23 MHz', 23_200, 23_350],
  ['VHF', 108_000, 137_000],
);

export const BAND_TABLE: readonly BandRow[] = [
  ...MEDIUM_WAVE,
  ...SHORT_WAVE,
  ...VHF_BROADCAST,
  ...AMATEUR,
  ...STANDARD_FREQUENCY,
  ...MARITIME,
  ...AERONAUTICAL,
];
