import { defineRule } from '../../define-rule.ts';
import { lensImplantOf, listWords, missingFrom } from '../../facts.ts';

export const rule = defineRule({
  id: 'lens-implant-incomplete',
  family: 'implants',
  level: 'omission',
  title: 'A lens implant without its form or where it sits',
  why: 'Material decides what oil does to it, position what power it has.',
  source: { text: '42 CFR 482.51(b)(6), tag A-0959: implants', certainty: 'R2' },
  answerable: true,
  check: (record) => {
    const lens = lensImplantOf(record);
    if (lens === undefined) return [];
    const missing = missingFrom([
      { field: 'vitreous.lensImplant.form', what: 'form and material', value: lens.form },
      { field: 'vitreous.lensImplant.position', what: 'position', value: lens.position },
    ]);
    if (missing.length === 0) return [];
    return [
      {
        fields: missing.map(({ field }) => field),
        message: `A lens implant is recorded without its ${listWords(missing.map(({ what }) => what))}.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'where',
        fields: 'vitreous.lensImplant.position',
        record: { vitreous: { lensImplant: { form: 'acrylic' } } },
      },
    ],
    silent: [
      { name: 'complete', record: { vitreous: { lensImplant: { form: 'acrylic', position: 'bag' } } } },
      { name: 'none', record: { vitreous: { lensImplant: 'not-applicable' } } },
    ],
    unknown: [{ name: 'not recorded', record: { vitreous: { lensWork: 'none' } } }],
  },
});
