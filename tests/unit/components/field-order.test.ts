import { describe, expect, it } from 'vitest';
import {
  fieldsInOrder,
  groupsHiding,
  nextEmpty,
  specNamed,
} from '../../../src/components/case/field-order.ts';
import { layoutOf, layouts } from '../../../src/components/case/stage-layouts.ts';
import { type FieldSpec, fieldTree, specsOnPath } from '../../../src/domain/record/field-tree.ts';
import { emptyRecord } from '../../../src/domain/record/schema.ts';

/** Every field that the rows of a group lead to, lists and groups inside included. */
const reached = (fields: readonly FieldSpec[], path: string): string[] => {
  const { usual, more } = layoutOf(path, fields);
  return [...usual, ...more].flatMap((row) =>
    row.fields.flatMap((name) => {
      const spec = specNamed(fields, name);
      if (spec === undefined) throw new Error(`No field ${path}.${name}`);
      const here = `${path}.${name}`;
      return 'fields' in spec ? reached(spec.fields, here) : [here];
    }),
  );
};

const leaves = (fields: readonly FieldSpec[], path: string): string[] =>
  fields.flatMap((field) => {
    const here = path === '' ? field.name : `${path}.${field.name}`;
    return 'fields' in field ? leaves(field.fields, here) : [here];
  });

describe('the layouts of the stages', () => {
  it.each(fieldTree.map((stage) => stage.name))('show every field of %s once', (name) => {
    const stage = fieldTree.filter((field) => field.name === name);
    const shown = stage.flatMap((field) => ('fields' in field ? reached(field.fields, name) : []));
    expect([...shown].sort()).toEqual(leaves(stage, '').sort());
    expect(new Set(shown).size).toBe(shown.length);
  });

  it('name groups that are there', () => {
    for (const path of Object.keys(layouts)) expect(specsOnPath(path), path).not.toEqual([]);
  });

  it('say as many words between fields as there are fields', () => {
    for (const [path, { usual, more = [] }] of Object.entries(layouts)) {
      for (const row of [...usual, ...more]) {
        if (row.between !== undefined) expect(row.between, path).toHaveLength(row.fields.length);
      }
    }
  });
});

describe('the order of the fields', () => {
  it('starts with the eye and goes through the stages', () => {
    const order = fieldsInOrder(emptyRecord());
    expect(order[0]).toBe('who.eye');
    expect(order.indexOf('before.macula')).toBeLessThan(order.indexOf('breaks.found'));
  });

  it('goes from a recorded field to the next empty one, and round', () => {
    const record = { ...emptyRecord(), who: { eye: 'left' as const } };
    expect(nextEmpty(record, null)).toBe('who.consentEye');
    expect(nextEmpty(record, 'who.consentEye')).toBe('who.markedEye');
    const last = fieldsInOrder(record).at(-1) ?? '';
    expect(nextEmpty(record, last)).toBe('who.consentEye');
  });

  it('goes into the items of lists, and passes over what does not apply', () => {
    const record = {
      ...emptyRecord(),
      buckle: { elements: [{ role: 'meridional' as const }] },
      tamponade: { agent: 'air' as const },
    };
    const order = fieldsInOrder(record);
    expect(order).toContain('buckle.elements.0.meridianClock');
    expect(order).not.toContain('buckle.elements.0.shortenedMm');
    expect(order).not.toContain('tamponade.viscosityCentistokes');
  });

  it('knows which group hides a less usual field', () => {
    expect(groupsHiding('buckle.elements.0.imbricatedOver')).toEqual(['buckle.elements.0']);
    expect(groupsHiding('who.patient.familyName')).toEqual(['who']);
    expect(groupsHiding('who.eye')).toEqual([]);
  });
});
