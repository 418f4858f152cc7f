import { describe, expect, it } from 'vitest';
import { FIELD_NAMES } from './field-names.js';
import { WRITABLE_TYPES, PARENT_FIELDS, sendingOrder } from './record-types.js';
import { RECORD_SCHEMAS } from './schemas.js';

describe('record types', () => {
  it.each(WRITABLE_TYPES)('should list exactly the fields of the schema of a %s', (type) => {
    expect([...FIELD_NAMES[type]].sort()).toEqual(Object.keys(RECORD_SCHEMAS[type].shape).sort());
  });

  it.each(WRITABLE_TYPES)('should send the parents of a %s before it', (type) => {
    for (const parent of PARENT_FIELDS[type]) {
      expect(sendingOrder(parent.type)).toBeLessThan(sendingOrder(type));
      expect(FIELD_NAMES[type]).toContain(parent.field);
    }
  });
});
