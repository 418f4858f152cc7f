import type { EvidenceInput } from '@harkmoor/sync-model/evidence/evidence-input';
import type { FieldsByType } from '@harkmoor/sync-model/records/schemas';
import type { DemoClub } from '../../scripts/demo/demo-club.js';

/** The demo as a member's phone holds it once everything has been pulled. */
export function demoEvidenceInput({ changes }: DemoClub): EvidenceInput {
  const of = <T extends keyof FieldsByType>(type: T) =>
    changes
      .filter((row) => row.log === 'club' && row.change.type === type)
      .map(({ change }) => ({ id: change.id, at: change.at, fields: change.fields as FieldsByType[T] }));
  const byId = <T extends keyof FieldsByType>(type: T) =>
    new Map(of(type).map(({ id, fields }) => [id, fields]));
  return {
    region: 1,
    receptions: of('reception').map(({ id, at, fields }) => ({
      id,
      ownerId: null,
      fields,
      deviceAtStamp: at,
    })),
    sites: byId('site'),
    setups: byId('setup'),
    receivers: byId('receiver'),
    targets: byId('target'),
    clockChecks: of('clock-check').map(({ fields }) => fields),
    dialChecks: [],
    outings: of('outing').map(({ at, fields }) => ({ fields, clockStepsStamp: at })),
  };
}
