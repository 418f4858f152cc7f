import type { z } from 'zod';

export type SchemaFault = { readonly field: string; readonly message: string };

/**
 * What a record's schema finds wrong with a form, the first fault of each field, in words that say what to do. The
 * field is the path with dots (`meterScale.s9Dbm`), as the form names its controls.
 */
export function schemaFaults(schema: z.ZodType, values: unknown): SchemaFault[] {
  const read = schema.safeParse(values);
  if (read.success) return [];
  const faults = new Map<string, string>();
  for (const issue of read.error.issues) {
    const field = issue.path.map(String).join('.');
    if (!faults.has(field)) faults.set(field, issueWords(issue));
  }
  return [...faults].map(([field, message]) => ({ field, message }));
}

function issueWords(issue: z.core.$ZodIssue): string {
  switch (issue.code) {
    case 'too_small':
      return tooSmall(issue);
    case 'too_big':
      return issue.origin === 'string'
        ? `Use at most ${issue.maximum} characters`
        : `At most ${plain(issue.maximum)}`;
    case 'invalid_type':
      return issue.expected === 'number' || issue.expected === 'int' ? 'Write a number' : 'Fill this in';
    case 'invalid_value':
    case 'invalid_union':
      return 'Choose one of the list';
    case 'custom':
    case 'invalid_format':
      return sentence(issue.message);
    default:
      return sentence(issue.message);
  }
}

function tooSmall(issue: Extract<z.core.$ZodIssue, { code: 'too_small' }>): string {
  if (issue.origin === 'string') return 'Fill this in';
  if (issue.origin === 'array') return 'Add at least one';
  return `At least ${plain(issue.minimum)}`;
}

function plain(limit: number | bigint): string {
  return Number(limit).toLocaleString('en-GB').replace(/,/g, '\u202f').replace('-', '\u2212');
}

/** The schemas speak in half sentences ("must be composed text"); a form begins with a capital. */
function sentence(message: string): string {
  return message.charAt(0).toUpperCase() + message.slice(1);
}
