import { defineRule } from '../../define-rule.ts';
import { gasOf, listWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'gas-advice-not-given',
  family: 'aftercare',
  level: 'omission',
  title: 'Gas in the eye, and the patient was not told',
  why: 'A patient who does not know flies, or is given nitrous oxide.',
  source: { text: 'Royal College of Ophthalmologists safety alert, 18 December 2018', certainty: 'R' },
  answerable: true,
  check: (record) => {
    const gas = gasOf(record);
    const { flyingAdviceGiven, nitrousOxideAdviceGiven } = record.aftercare ?? {};
    const not = [
      flyingAdviceGiven === false ? { field: 'aftercare.flyingAdviceGiven', what: 'not to fly' } : undefined,
      nitrousOxideAdviceGiven === false
        ? { field: 'aftercare.nitrousOxideAdviceGiven', what: 'of nitrous oxide' }
        : undefined,
    ].filter((one) => one !== undefined);
    if (gas === undefined || not.length === 0) return [];
    return [
      {
        fields: not.map(({ field }) => field),
        message: `${gas === 'air' ? 'Air' : gas} is left in the eye; the patient was not told ${listWords(not.map(({ what }) => what))}.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'not told',
        fields: 'aftercare.flyingAdviceGiven',
        record: { tamponade: { agent: 'C3F8' }, aftercare: { flyingAdviceGiven: false } },
      },
    ],
    silent: [
      { name: 'told', record: { tamponade: { agent: 'C3F8' }, aftercare: { flyingAdviceGiven: true } } },
    ],
    unknown: [{ name: 'not recorded', record: { tamponade: { agent: 'C3F8' } } }],
  },
});
