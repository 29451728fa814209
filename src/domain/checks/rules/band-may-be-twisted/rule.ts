import { defineRule } from '../../define-rule.ts';
import { closureOf, elementsOf, isEncircling, labelOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'band-may-be-twisted',
  family: 'closure',
  level: 'omission',
  title: 'An encircling band without the check that it is not twisted',
  why: 'A twisted band stands on its edge and cuts in.',
  source: {
    text: 'Ends cut to match and laid the same way show that the band is not twisted',
    certainty: 'P',
  },
  answerable: true,
  check: (record) =>
    elementsOf(record).flatMap((element, index) => {
      const closure = closureOf(element);
      if (
        !isEncircling(element) ||
        closure?.kind === undefined ||
        closure.endsMatch !== undefined ||
        (element.form !== 'band' && element.form !== 'strip')
      )
        return [];
      return [
        {
          fields: [`buckle.elements.${index}.closure.endsMatch`],
          message: `The ends of the band were joined by ${labelOf('buckle.elements.closure.kind', closure.kind)}; whether it lies without a twist is not recorded.`,
        },
      ];
    }),
  examples: {
    fires: [
      {
        name: 'not said',
        fields: 'buckle.elements.0.closure.endsMatch',
        record: { buckle: { elements: [{ role: 'encircling', form: 'band', closure: { kind: 'sleeve' } }] } },
      },
    ],
    silent: [
      {
        name: 'checked',
        record: {
          buckle: {
            elements: [{ role: 'encircling', form: 'band', closure: { kind: 'sleeve', endsMatch: true } }],
          },
        },
      },
    ],
    unknown: [
      { name: 'not joined yet', record: { buckle: { elements: [{ role: 'encircling', form: 'band' }] } } },
    ],
  },
});
