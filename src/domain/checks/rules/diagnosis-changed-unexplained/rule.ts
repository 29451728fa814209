import { defineRule } from '../../define-rule.ts';
import { labelOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'diagnosis-changed-unexplained',
  family: 'diagnosis',
  level: 'caution',
  title: 'The diagnosis after is of another kind than before, without a word',
  why: 'A change from traction or serous fluid to a break, or back, changes the operation and the code.',
  source: {
    text: 'C-CDA Operative Note: preoperative diagnosis 10219-4, postoperative 10218-6',
    certainty: 'R',
  },
  answerable: true,
  unless: ['diagnosis-against-breaks', 'breaks-in-serous-detachment', 'fluid-without-detachment'],
  check: ({ before, endOfCase, who }) => {
    const first = before?.diagnosis;
    const last = endOfCase?.postoperativeDiagnosis;
    if (first === undefined || last === undefined || first === last) return [];
    const withBreak = ['rhegmatogenous', 'giant-tear', 'dialysis'];
    if (withBreak.includes(first) && withBreak.includes(last)) return [];
    if (
      endOfCase?.remarks !== undefined ||
      endOfCase?.extraSteps !== undefined ||
      who?.whyChanged !== undefined
    )
      return [];
    return [
      {
        fields: ['endOfCase.postoperativeDiagnosis', 'before.diagnosis'],
        message: `The diagnosis was ${labelOf('before.diagnosis', first)} before and ${labelOf('before.diagnosis', last)} after; why is not recorded.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'serous after all',
        fields: 'endOfCase.postoperativeDiagnosis',
        record: { before: { diagnosis: 'rhegmatogenous' }, endOfCase: { postoperativeDiagnosis: 'serous' } },
      },
    ],
    silent: [
      {
        name: 'the tear was a giant one',
        record: {
          before: { diagnosis: 'rhegmatogenous' },
          endOfCase: { postoperativeDiagnosis: 'giant-tear' },
        },
      },
      {
        name: 'with a word',
        record: {
          before: { diagnosis: 'rhegmatogenous' },
          endOfCase: {
            postoperativeDiagnosis: 'serous',
            remarks: 'No break on indentation; shifting fluid.',
          },
        },
      },
    ],
    unknown: [{ name: 'not recorded after', record: { before: { diagnosis: 'rhegmatogenous' } } }],
  },
});
