import { defineRule } from '../../define-rule.ts';
import { listWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'required-end',
  family: 'standards',
  level: 'omission',
  title: 'Required items of the end of the case are missing',
  why: 'Of 999 operative reports only 57% said whether there were complications.',
  source: {
    text: 'C-CDA Operative Note: complications 55109-3, blood loss 59770-8, specimens 59773-2, postoperative diagnosis 10218-6',
    certainty: 'R',
  },
  answerable: true,
  check: ({ endOfCase }) => {
    const items = [
      {
        field: 'endOfCase.postoperativeDiagnosis',
        what: 'the postoperative diagnosis',
        value: endOfCase?.postoperativeDiagnosis,
      },
      { field: 'endOfCase.retina', what: 'the retina', value: endOfCase?.retina },
      { field: 'endOfCase.complications', what: 'complications or none', value: endOfCase?.complications },
      { field: 'endOfCase.bloodLoss', what: 'blood loss', value: endOfCase?.bloodLoss },
      { field: 'endOfCase.specimens', what: 'specimens or none', value: endOfCase?.specimens },
      {
        field: 'endOfCase.pressureMmHg',
        what: 'the pressure',
        value: endOfCase?.pressureMmHg ?? endOfCase?.pressureBy,
      },
      { field: 'endOfCase.medicines', what: 'medicines given or none', value: endOfCase?.medicines },
    ].filter(({ value }) => value === undefined);
    if (items.length === 0) return [];
    return [
      {
        fields: items.map(({ field }) => field),
        message: `Not recorded: ${listWords(items.map(({ what }) => what))}.`,
      },
    ];
  },
  examples: {
    fires: [{ name: 'nothing', fields: 'endOfCase.postoperativeDiagnosis', record: {} }],
    silent: [
      {
        name: 'complete',
        record: {
          endOfCase: {
            postoperativeDiagnosis: 'rhegmatogenous',
            retina: 'flat',
            complications: 'none',
            bloodLoss: 'minimal',
            specimens: 'none',
            pressureMmHg: 18,
            medicines: 'none',
          },
        },
      },
    ],
    unknown: [],
  },
});
