import { z } from 'zod';

/** A body with one thing wrong; `at` is the dotted path of that thing. */
export type Misfit = { readonly what: string; readonly at: string; readonly value: unknown };

type Schema = {
  readonly type?: string | readonly string[];
  readonly properties?: Record<string, Schema>;
  readonly required?: readonly string[];
  readonly items?: Schema;
  readonly minLength?: number;
  readonly maxLength?: number;
  readonly maxItems?: number;
};

const SCRIPT = '<script>alert(1)</script>';

/** Bodies made from a schema and a body that is right: each has one thing empty, too long, of a wrong type or strange. */
export function misfitsOf(schema: z.ZodType, right: unknown): Misfit[] {
  const json = z.toJSONSchema(schema, { io: 'input', unrepresentable: 'any' }) as Schema;
  const whole = [null, [], 'text', 7, true].map((value) => ({
    what: `a body that is ${JSON.stringify(value)}`,
    at: '',
    value: value as unknown,
  }));
  return [...whole, ...inside(json, right, [], (value) => value)];
}

/** Walks schema and right value together; `put` sets a changed part back into the whole. */
function inside(
  schema: Schema,
  right: unknown,
  path: readonly string[],
  put: (part: unknown) => unknown,
): Misfit[] {
  if (Array.isArray(right)) return insideList(schema, right, path, put);
  if (typeof right === 'object' && right !== null) {
    return insideObject(schema, right as Record<string, unknown>, path, put);
  }
  const at = path.join('.');
  return strange(schema).map(([what, value]) => ({ what: `${at} ${what}`, at, value: put(value) }));
}

function insideObject(
  schema: Schema,
  right: Record<string, unknown>,
  path: readonly string[],
  put: (part: unknown) => unknown,
): Misfit[] {
  const at = path.join('.');
  const found: Misfit[] = [
    { what: `${at} with a field too many`, at, value: put({ ...right, role: 'admin', isAdmin: true }) },
    { what: `${at} with a prototype`, at, value: put(JSON.parse('{"__proto__":{"x":1}}') as unknown) },
  ];
  for (const [name, part] of Object.entries(right)) {
    const { [name]: _, ...without } = right;
    const inner = [...path, name];
    if (schema.required?.includes(name)) {
      found.push({ what: `${inner.join('.')} missing`, at: inner.join('.'), value: put(without) });
    }
    const partSchema = schema.properties?.[name] ?? {};
    found.push(...inside(partSchema, part, inner, (value) => put({ ...right, [name]: value })));
  }
  return found;
}

function insideList(
  schema: Schema,
  right: readonly unknown[],
  path: readonly string[],
  put: (part: unknown) => unknown,
): Misfit[] {
  const at = path.join('.');
  const tooMany = Array.from({ length: (schema.maxItems ?? 1000) + 1 }, () => right[0]);
  const found: Misfit[] = [
    { what: `${at} with too many items`, at, value: put(tooMany) },
    { what: `${at} an object`, at, value: put({ 0: right[0] }) },
    { what: `${at} null`, at, value: put(null) },
  ];
  if (right.length === 0) return found;
  const first = inside(schema.items ?? {}, right[0], [...path, '0'], (value) =>
    put([value, ...right.slice(1)]),
  );
  return [...found, ...first];
}

function strange(schema: Schema): [string, unknown][] {
  const tooLong = 'x'.repeat((schema.maxLength ?? 5000) + 1);
  return [
    ['empty', ''],
    ['blank', '   '],
    ['too long', tooLong],
    ['script text', SCRIPT],
    ['with a null character', 'a\u0000b'],
    ['with a lone surrogate', '\ud800'],
    ['decomposed', 'e\u0301e\u0301e\u0301e\u0301'],
    ['null', null],
    ['a number', 12.5],
    ['a negative number', -1],
    ['far out of range', 1e300],
    ['true', true],
    ['a list', ['a']],
    ['an object', { $ne: null }],
  ];
}
