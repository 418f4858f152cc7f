import { useCallback, useEffect, useRef, useState, type RefObject } from 'react';

/** One fault of a form: the field's name and a sentence that says what to do. */
export type FieldFault = { readonly field: string; readonly message: string };

export type FormErrors = {
  /** Goes on the `<form>`: faults are looked up in it by field name. */
  readonly ref: RefObject<HTMLFormElement | null>;
  readonly faults: readonly FieldFault[];
  /** Spread on a field: its name and its error. */
  field(name: string): { readonly name: string; readonly error: string | null };
  /** Shows the faults and moves to the first; true when there is none. */
  report(faults: readonly FieldFault[]): boolean;
  /** Takes the error off a field once it is being mended. */
  mended(name: string): void;
};

/**
 * The errors of a form: shown beside their fields and in a summary, with the first faulty field focused.
 * `useFormErrors` holds no values: those stay in the screen.
 */
export function useFormErrors(): FormErrors {
  const ref = useRef<HTMLFormElement | null>(null);
  const [faults, setFaults] = useState<readonly FieldFault[]>([]);
  // an object a report: only a new report moves the focus, mending the first field must not jump to the second
  const [goal, setGoal] = useState<{ readonly field: string } | null>(null);

  useEffect(() => {
    if (!goal) return;
    const control = ref.current?.querySelector<HTMLElement>(`[name="${CSS.escape(goal.field)}"]`);
    (control ?? ref.current?.querySelector<HTMLElement>('.hm-summary'))?.focus();
  }, [goal]);

  const report = useCallback((next: readonly FieldFault[]): boolean => {
    setFaults(next);
    const [first] = next;
    if (first) setGoal({ field: first.field });
    return first === undefined;
  }, []);
  const mended = useCallback((name: string): void => {
    setFaults((before) =>
      before.some((fault) => fault.field === name) ? before.filter((fault) => fault.field !== name) : before,
    );
  }, []);
  const field = (name: string) => ({
    name,
    error: faults.find((fault) => fault.field === name)?.message ?? null,
  });
  return { ref, faults, field, report, mended };
}

/** Faults from a schema's issues (path and message): the first of each field. */
export function faultsOf(
  issues: readonly { readonly path: readonly PropertyKey[]; readonly message: string }[],
): FieldFault[] {
  const byField = new Map<string, FieldFault>();
  for (const issue of issues) {
    const field = issue.path.map(String).join('.');
    if (!byField.has(field)) byField.set(field, { field, message: issue.message });
  }
  return [...byField.values()];
}
