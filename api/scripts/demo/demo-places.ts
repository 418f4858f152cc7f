import type { Site } from '@harkmoor/sync-model/records/site';

/** Some thirty invented places on an invented stretch of the Danish west coast, between Vesterklit and Marram point. */
export type DemoPlace = {
  readonly name: string;
  readonly latDeg: number;
  readonly lonDeg: number;
  readonly environment: Site['environment'];
  readonly home?: true;
};

export const DEMO_PLACES: readonly DemoPlace[] = [
  place('Ravnklit dune', 56.104, 8.032, 'quiet-rural'),
  place('Marram point', 56.142, 8.111, 'quiet-rural'),
  place('Hvidsande spit', 56.021, 8.118, 'rural'),
  place('Skovtop hill', 56.213, 8.346, 'rural'),
  place('Lyngmose heath', 56.268, 8.421, 'quiet-rural'),
  place('Tornby mole', 56.173, 8.121, 'residential'),
  place('Old radio field', 56.091, 8.154, 'rural'),
  place('Kaersande lagoon', 56.058, 8.246, 'quiet-rural'),
  place('Vesterklit car park', 56.309, 8.128, 'rural'),
  place('Fjordende', 56.342, 8.263, 'rural'),
  place('Sandholm island', 56.387, 8.204, 'quiet-rural'),
  place('Stenrev lighthouse', 56.431, 8.122, 'quiet-rural'),
  place('Nørhede plantation', 56.452, 8.387, 'rural'),
  place('Gammel ferry landing', 56.374, 8.466, 'rural'),
  place('Holmsande church wall', 56.493, 8.241, 'residential'),
  place('Tange hollow', 56.531, 8.319, 'quiet-rural'),
  place('Blåklit beach', 55.982, 8.144, 'quiet-rural'),
  place('Rimmerlund garden', 55.953, 8.297, 'residential', true),
  place('Klitgaarden yard', 55.914, 8.186, 'residential', true),
  place('Østertoft quay', 55.887, 8.338, 'city'),
  place('Havrup moor', 55.846, 8.251, 'quiet-rural'),
  place('Kragerup ridge', 55.812, 8.402, 'rural'),
  place('Sønderrev', 55.779, 8.173, 'quiet-rural'),
  place('Mågeholm island', 56.566, 8.178, 'quiet-rural'),
  place('Bredsig meadow', 56.602, 8.292, 'rural'),
  place('Vandelhøj barrow', 56.237, 8.551, 'rural'),
  place('Hedekanten', 56.161, 8.512, 'rural'),
  place('Sluice at Kaersande', 56.039, 8.352, 'rural'),
  place('Strandhede north', 56.627, 8.133, 'quiet-rural'),
  place('Ulvdal quarry', 56.078, 8.448, 'rural'),
];

function place(
  name: string,
  latDeg: number,
  lonDeg: number,
  environment: Site['environment'],
  home?: true,
): DemoPlace {
  return { name, latDeg, lonDeg, environment, ...(home ? { home } : {}) };
}
