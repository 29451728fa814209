import { defineRule } from '../../define-rule.ts';
import { breaksOf, labelOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'preoperative-diagnosis-not-borne-out',
  family: 'diagnosis',
  level: 'caution',
  title: 'The preoperative diagnosis names a break that was not found',
  why: 'What was expected and what was found may differ; then the postoperative diagnosis says so.',
  source: { text: 'Trade practice', certainty: 'P' },
  answerable: true,
  unless: ['diagnosis-against-breaks'],
  check: (record) => {
    const diagnosis = record.before?.diagnosis;
    const kinds = breaksOf(record).map(({ kind }) => kind);
    const after = record.endOfCase?.postoperativeDiagnosis;
    if ((diagnosis !== 'giant-tear' && diagnosis !== 'dialysis') || record.breaks?.found === undefined)
      return [];
    if (
      kinds.includes(undefined) ||
      kinds.includes(diagnosis) ||
      (after !== undefined && after !== diagnosis)
    )
      return [];
    return [
      {
        fields: ['before.diagnosis', 'breaks.found'],
        message: `The preoperative diagnosis is ${labelOf('before.diagnosis', diagnosis)}; no such break is recorded.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'no dialysis found',
        fields: 'before.diagnosis',
        record: { before: { diagnosis: 'dialysis' }, breaks: { found: [{ kind: 'horseshoe' }] } },
      },
    ],
    silent: [
      {
        name: 'found otherwise and said so',
        record: {
          before: { diagnosis: 'dialysis' },
          breaks: { found: [{ kind: 'horseshoe' }] },
          endOfCase: { postoperativeDiagnosis: 'rhegmatogenous' },
        },
      },
    ],
    unknown: [
      {
        name: 'kind not recorded',
        record: { before: { diagnosis: 'dialysis' }, breaks: { found: [{ clock: 4 }] } },
      },
    ],
  },
});
