import { isAbsorbable } from '../../../physics/sutures.ts';
import { defineRule } from '../../define-rule.ts';
import { closureOf, elementsOf, isEncircling, labelOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'lasting-closure-temporary-band',
  family: 'closure',
  level: 'omission',
  title: 'A temporary band with a lasting join and no plan to release it',
  why: 'Nobody releases what nobody planned to release.',
  source: {
    text: 'An absorbable knot makes a temporary band; a lasting one must be released',
    certainty: 'P',
  },
  answerable: true,
  check: (record) =>
    elementsOf(record).flatMap((element, index) => {
      const closure = closureOf(element);
      if (!isEncircling(element) || element.intention !== 'temporary' || closure?.kind === undefined)
        return [];
      const material = closure.material;
      const goes = material !== undefined && isAbsorbable(material);
      const unsure = material === undefined && (closure.kind === 'knot' || closure.kind === 'suture');
      if (goes || unsure || record.aftercare?.elementRemovalInMonths !== undefined) return [];
      const join = labelOf('buckle.elements.closure.kind', closure.kind);
      const message = `The band is intended to be temporary and is joined by a lasting ${join}; no release is planned.`;
      return [
        { fields: ['aftercare.elementRemovalInMonths', `buckle.elements.${index}.closure.kind`], message },
      ];
    }),
  examples: {
    fires: [
      {
        name: 'sleeve',
        fields: 'aftercare.elementRemovalInMonths',
        record: {
          buckle: { elements: [{ role: 'encircling', intention: 'temporary', closure: { kind: 'sleeve' } }] },
        },
      },
    ],
    silent: [
      {
        name: 'release planned',
        record: {
          buckle: { elements: [{ role: 'encircling', intention: 'temporary', closure: { kind: 'sleeve' } }] },
          aftercare: { elementRemovalInMonths: 3 },
        },
      },
    ],
    unknown: [
      {
        name: 'knot of unknown material',
        record: {
          buckle: { elements: [{ role: 'encircling', intention: 'temporary', closure: { kind: 'knot' } }] },
        },
      },
    ],
  },
});
