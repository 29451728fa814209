import { defineRule } from '../../define-rule.ts';
import { labelOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'diagnosis-against-breaks',
  family: 'diagnosis',
  level: 'contradiction',
  title: 'The diagnosis names a kind of break that was not found, or none was found',
  why: 'The diagnosis decides the code and what the next reader expects.',
  source: { text: 'ICD-10-CM H33.0: break, giant tear and dialysis are told apart', certainty: 'R' },
  answerable: false,
  check: (record) => {
    const diagnosis = record.endOfCase?.postoperativeDiagnosis;
    const field = 'endOfCase.postoperativeDiagnosis';
    const found = record.breaks?.found;
    if (diagnosis === undefined || found === undefined) return [];
    const kinds = found === 'none' ? [] : found.map(({ kind }) => kind);
    if (kinds.includes(undefined)) return [];
    const wanted =
      diagnosis === 'giant-tear' ? 'giant-tear' : diagnosis === 'dialysis' ? 'dialysis' : undefined;
    const name = labelOf('before.diagnosis', diagnosis);
    if (wanted !== undefined && !kinds.includes(wanted)) {
      return [
        { fields: [field, 'breaks.found'], message: `The diagnosis is ${name}; no such break is recorded.` },
      ];
    }
    if (diagnosis === 'rhegmatogenous' && (kinds.includes('giant-tear') || kinds.includes('dialysis'))) {
      const kind = kinds.includes('giant-tear') ? 'giant retinal tear' : 'dialysis';
      return [
        {
          fields: [field, 'breaks.found'],
          message: `A ${kind} is recorded; the diagnosis is ${name} without it.`,
        },
      ];
    }
    if (diagnosis === 'break-without-detachment' && found === 'none') {
      return [
        { fields: [field, 'breaks.found'], message: `The diagnosis is ${name}; no break is recorded.` },
      ];
    }
    return [];
  },
  examples: {
    fires: [
      {
        name: 'giant tear not found',
        fields: 'endOfCase.postoperativeDiagnosis',
        record: {
          endOfCase: { postoperativeDiagnosis: 'giant-tear' },
          breaks: { found: [{ kind: 'horseshoe' }] },
        },
      },
      {
        name: 'dialysis found',
        fields: 'endOfCase.postoperativeDiagnosis',
        record: {
          endOfCase: { postoperativeDiagnosis: 'rhegmatogenous' },
          breaks: { found: [{ kind: 'dialysis' }] },
        },
      },
    ],
    silent: [
      {
        name: 'horseshoe tear',
        record: {
          endOfCase: { postoperativeDiagnosis: 'rhegmatogenous' },
          breaks: { found: [{ kind: 'horseshoe' }] },
        },
      },
      {
        name: 'no break found in a detachment',
        record: { endOfCase: { postoperativeDiagnosis: 'rhegmatogenous' }, breaks: { found: 'none' } },
      },
    ],
    unknown: [
      {
        name: 'kind not recorded',
        record: { endOfCase: { postoperativeDiagnosis: 'dialysis' }, breaks: { found: [{ clock: 4 }] } },
      },
    ],
  },
});
