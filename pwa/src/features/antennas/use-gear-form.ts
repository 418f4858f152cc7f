import { useState } from 'react';
import type { z } from 'zod';
import { useFormErrors } from '../../design/form/use-form-errors';
import { sameValue } from '@harkmoor/sync-model/merge/canonical-json';
import { schemaFaults } from '../../platform/schema-faults';

/** The values of a gear form, what is wrong with them by the record's own schema, and whether they were touched. */
export function useGearForm<T extends object>(initial: T, schema: z.ZodType) {
  const errors = useFormErrors();
  const [values, setValues] = useState<T>(initial);
  const [start] = useState<T>(initial);
  const set = <K extends keyof T & string>(field: K, value: T[K]): void => {
    errors.mended(field);
    setValues((before) => ({ ...before, [field]: value }));
  };
  return {
    errors,
    values,
    set,
    isDirty: !sameValue(values, start),
    /** Shows the faults; true where there are any. */
    isFaulty: () => !errors.report(schemaFaults(schema, values)),
  };
}
