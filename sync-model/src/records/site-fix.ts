import { z } from 'zod';
import { commonFields, instantSchema, latDegSchema, lonDegSchema } from './common-fields.js';

export const FIX_SOURCES = ['live', 'averaged', 'map', 'locator'] as const;

/** The exact position of a site, kept in the owner's My log under the site's own id and never shared. */
export const siteFixSchema = z.strictObject({
  ...commonFields,
  fix: z.strictObject({
    latDeg: latDegSchema,
    lonDeg: lonDegSchema,
    accuracyM: z.number().min(0).max(100_000),
    source: z.enum(FIX_SOURCES),
    fixedAt: instantSchema,
    averagedS: z.number().min(0).max(86_400).optional(),
  }),
  elevationM: z.number().min(-450).max(9000).nullable(),
  home: z.boolean(),
});
export type SiteFix = z.infer<typeof siteFixSchema>;
