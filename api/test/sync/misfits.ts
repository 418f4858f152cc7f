import { z } from 'zod';
import { WRITABLE_TYPES, type WritableType } from '@harkmoor/sync-model/records/record-types';
import { RECORD_SCHEMAS } from '@harkmoor/sync-model/records/schemas';

type JsonSchema = {
  type?: string;
  anyOf?: JsonSchema[];
  enum?: unknown[];
  pattern?: string;
  maxLength?: number;
  minimum?: number;
  maximum?: number;
  maxItems?: number;
  properties?: Record<string, JsonSchema>;
};

export type Misfit = { readonly type: WritableType; readonly field: string; readonly value: unknown };

const SCRIPT = '<script>alert(1)</script>';

/** Values that no schema of a field takes, made from the schema itself: kind, length, range, shape, text. */
export function misfits(): Misfit[] {
  return WRITABLE_TYPES.flatMap((type) =>
    Object.entries(RECORD_SCHEMAS[type].shape).flatMap(([field, part]) => {
      const whole = z.toJSONSchema(part as z.ZodType, { unrepresentable: 'any' }) as JsonSchema;
      const forms = whole.anyOf ?? [whole];
      const takesNull = forms.some((form) => form.type === 'null');
      const values = forms.flatMap(outside);
      if (!takesNull && field !== 'deleted') values.push(null);
      return values
        .filter((value) => !(part as z.ZodType).safeParse(value).success)
        .map((value) => ({ type, field, value }));
    }),
  );
}

function outside(form: JsonSchema): unknown[] {
  const otherKinds = ['x'.repeat(5000), -1e300, true, [SCRIPT], { constructor: 1 }, '__proto__'];
  switch (form.type) {
    case 'string':
      return [...otherKinds, SCRIPT, 'nul \u0000', 'half \ud83d', 'e\u0301', '', ' '];
    case 'integer':
    case 'number':
      return [...otherKinds, (form.minimum ?? 0) - 1, (form.maximum ?? 0) + 1, 1.5, 2 ** 60, '12'];
    case 'array':
      return [...otherKinds, Array.from({ length: (form.maxItems ?? 500) + 1 }, () => 1), [null], [[]]];
    case 'object':
      return [...otherKinds, {}, { ...emptied(form), extra: 1 }, { ...emptied(form) }];
    default:
      return otherKinds;
  }
}

function emptied(form: JsonSchema): Record<string, unknown> {
  return Object.fromEntries(Object.keys(form.properties ?? {}).map((key) => [key, SCRIPT]));
}
