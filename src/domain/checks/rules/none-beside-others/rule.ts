import { defineRule } from '../../define-rule.ts';
import { breaksOf, capital, labelOf, listWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'none-beside-others',
  family: 'standards',
  level: 'contradiction',
  title: 'None, and something else in the same field',
  why: 'The letters and the codes read the field, and it says two things.',
  source: { text: 'The record itself', certainty: 'P' },
  answerable: false,
  check: (record) => {
    const fields = [
      { field: 'vitreous.membranesPeeled', values: record.vitreous?.membranesPeeled },
      { field: 'endOfCase.tissue', values: record.endOfCase?.tissue },
      ...breaksOf(record).map(({ treatedBy }, index) => ({
        field: `breaks.found.${index}.treatedBy`,
        values: treatedBy,
      })),
    ];
    return fields.flatMap(({ field, values }) => {
      const words: readonly string[] = values ?? [];
      if (!words.includes('none') || words.length < 2) return [];
      const others = listWords(words.filter((one) => one !== 'none').map((one) => labelOf(field, one)));
      return [
        {
          fields: [field],
          message: `${capital(labelOf(field, 'none'))} is recorded together with ${others}.`,
        },
      ];
    });
  },
  examples: {
    fires: [
      {
        name: 'peeled and none',
        fields: 'vitreous.membranesPeeled',
        record: { vitreous: { membranesPeeled: ['none', 'ilm'] } },
      },
    ],
    silent: [
      { name: 'none', record: { vitreous: { membranesPeeled: ['none'] } } },
      { name: 'two membranes', record: { vitreous: { membranesPeeled: ['epiretinal', 'ilm'] } } },
    ],
    unknown: [{ name: 'not recorded', record: { vitreous: { vitrectomy: true } } }],
  },
});
