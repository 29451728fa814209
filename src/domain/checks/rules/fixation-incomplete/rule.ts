import { defineRule } from '../../define-rule.ts';
import { elementName, elementsOf, fixationsOf, listWords, missingFrom } from '../../facts.ts';

export const rule = defineRule({
  id: 'fixation-incomplete',
  family: 'buckle',
  level: 'omission',
  title: 'A fixation without its quadrant, kind or material',
  why: 'Whether an element still holds depends on what it was sewn with, and removal starts at the sutures.',
  source: {
    text: 'Fixation: mattress suture or scleral tunnel; suture strength by material',
    certainty: 'R',
  },
  answerable: true,
  check: (record) =>
    elementsOf(record).flatMap((element, index) => {
      const missing = missingFrom(
        fixationsOf(element).flatMap(({ quadrant, kind, material }, at) => {
          const base = `buckle.elements.${index}.fixation.${at}`;
          return [
            { field: `${base}.quadrant`, what: 'quadrant', value: quadrant },
            { field: `${base}.kind`, what: 'kind', value: kind },
            {
              field: `${base}.material`,
              what: 'suture material',
              value: kind === 'mattress-suture' ? material : 'held by the sclera',
            },
          ];
        }),
      );
      if (missing.length === 0) return [];
      const what = [...new Set(missing.map((one) => one.what))];
      const places = new Set(missing.map(({ field }) => field.split('.')[4]));
      return [
        {
          fields: missing.map(({ field }) => field),
          message: `${elementName(element, index)}: the ${listWords(what)} of ${places.size} of ${fixationsOf(element).length} fixations ${what.length === 1 ? 'is' : 'are'} not recorded.`,
        },
      ];
    }),
  examples: {
    fires: [
      {
        name: 'a suture of nothing',
        fields: 'buckle.elements.0.fixation.0.material',
        record: {
          buckle: { elements: [{ fixation: [{ quadrant: 'superonasal', kind: 'mattress-suture' }] }] },
        },
      },
      {
        name: 'nowhere',
        fields: 'buckle.elements.0.fixation.0.quadrant',
        record: { buckle: { elements: [{ fixation: [{ kind: 'scleral-tunnel' }] }] } },
      },
    ],
    silent: [
      {
        name: 'tunnel',
        record: {
          buckle: { elements: [{ fixation: [{ quadrant: 'superonasal', kind: 'scleral-tunnel' }] }] },
        },
      },
    ],
    unknown: [{ name: 'fixation not recorded', record: { buckle: { elements: [{ role: 'encircling' }] } } }],
  },
});
