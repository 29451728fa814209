import { defineRule } from '../../define-rule.ts';
import { elementsOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'under-band-without-band',
  family: 'buckle',
  level: 'contradiction',
  title: 'An implant under the band, and no band',
  why: 'Whoever takes it out later looks for a band.',
  source: { text: 'The record itself', certainty: 'P' },
  answerable: false,
  check: (record) => {
    const roles = elementsOf(record).map(({ role }) => role);
    const index = roles.indexOf('under-band');
    if (index < 0 || roles.includes(undefined) || roles.includes('encircling')) return [];
    // A band of an earlier operation may lie there still.
    const before = record.before?.previousOperations;
    if (
      before === undefined ||
      (Array.isArray(before) &&
        before.some(
          ({ what }) =>
            what === undefined || what === 'encircling-band' || what === 'scleral-buckle' || what === 'other',
        ))
    )
      return [];
    return [
      {
        fields: [`buckle.elements.${index}.role`],
        message: `Element ${index + 1} is recorded as an implant under the band; no encircling band is recorded, in this operation or before.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'no band',
        fields: 'buckle.elements.0.role',
        record: { before: { previousOperations: 'none' }, buckle: { elements: [{ role: 'under-band' }] } },
      },
    ],
    silent: [
      {
        name: 'under the band',
        record: {
          before: { previousOperations: 'none' },
          buckle: { elements: [{ role: 'encircling' }, { role: 'under-band' }] },
        },
      },
      {
        name: 'under the band of an earlier operation',
        record: {
          before: { previousOperations: [{ what: 'encircling-band', eye: 'left' }] },
          buckle: { elements: [{ role: 'under-band' }] },
        },
      },
    ],
    unknown: [{ name: 'history not recorded', record: { buckle: { elements: [{ role: 'under-band' }] } } }],
  },
});
