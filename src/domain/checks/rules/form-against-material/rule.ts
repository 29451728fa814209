import { defineRule } from '../../define-rule.ts';
import { elementsOf, labelOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'form-against-material',
  family: 'buckle',
  level: 'contradiction',
  title: 'Form and material of an element do not go together',
  why: 'A sponge that is called solid cannot be found again by its name.',
  source: { text: 'Forms: solid silicone band, strip, tyre; silicone sponge round or oval', certainty: 'R' },
  answerable: false,
  check: (record) =>
    elementsOf(record).flatMap(({ form, material }, index) => {
      const sponge = form === 'round-sponge' || form === 'oval-sponge';
      const solid = form === 'band' || form === 'strip' || form === 'tyre';
      if (form === undefined || material === undefined) return [];
      if (!((sponge && material === 'solid-silicone') || (solid && material === 'silicone-sponge')))
        return [];
      return [
        {
          fields: [`buckle.elements.${index}.material`, `buckle.elements.${index}.form`],
          message: `Element ${index + 1} is recorded as a ${labelOf('buckle.elements.form', form)} of ${labelOf('buckle.elements.material', material)}.`,
        },
      ];
    }),
  examples: {
    fires: [
      {
        name: 'solid sponge',
        fields: 'buckle.elements.0.material',
        record: { buckle: { elements: [{ form: 'round-sponge', material: 'solid-silicone' }] } },
      },
    ],
    silent: [
      {
        name: 'solid band',
        record: { buckle: { elements: [{ form: 'band', material: 'solid-silicone' }] } },
      },
    ],
    unknown: [
      { name: 'material not recorded', record: { buckle: { elements: [{ form: 'round-sponge' }] } } },
    ],
  },
});
