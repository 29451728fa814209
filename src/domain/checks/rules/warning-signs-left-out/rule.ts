import { defineRule } from '../../define-rule.ts';
import { labelOf, listWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'warning-signs-left-out',
  family: 'aftercare',
  level: 'caution',
  title: 'Warning signs told without pain or loss of sight',
  why: 'Pain and loss of sight are how pressure and infection show; a patient who does not know them waits.',
  source: { text: 'Academy of Medical Royal Colleges, Please, write to me, 2018', certainty: 'P' },
  answerable: true,
  check: ({ aftercare }) => {
    const signs: readonly string[] | undefined = aftercare?.warningSigns;
    if (signs === undefined) return [];
    const left = ['pain', 'loss-of-sight'].filter((sign) => !signs.includes(sign));
    if (left.length === 0) return [];
    return [
      {
        fields: ['aftercare.warningSigns'],
        message: `The warning signs told leave out ${listWords(left.map((sign) => labelOf('aftercare.warningSigns', sign)))}.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'no pain',
        fields: 'aftercare.warningSigns',
        record: { aftercare: { warningSigns: ['new-shadow', 'loss-of-sight'] } },
      },
    ],
    silent: [{ name: 'both', record: { aftercare: { warningSigns: ['pain', 'loss-of-sight'] } } }],
    unknown: [{ name: 'not recorded', record: { aftercare: { reviewInDays: 1 } } }],
  },
});
