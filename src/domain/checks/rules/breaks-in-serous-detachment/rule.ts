import { defineRule } from '../../define-rule.ts';
import { breaksOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'breaks-in-serous-detachment',
  family: 'diagnosis',
  level: 'contradiction',
  title: 'A serous detachment with a break on detached retina',
  why: 'A serous detachment has no break; H33.0 and H33.2 exclude each other.',
  source: { text: 'ICD-10-CM Excludes1: H33.0 with H33.2', certainty: 'R2' },
  answerable: false,
  check: (record) => {
    // A diagnosis from before that the operation did not bear out is no contradiction.
    const index = breaksOf(record).findIndex(
      ({ onDetachedRetina, kind }) =>
        onDetachedRetina === true || kind === 'giant-tear' || kind === 'dialysis',
    );
    if (record.endOfCase?.postoperativeDiagnosis !== 'serous' || index < 0) return [];
    return [
      {
        fields: ['endOfCase.postoperativeDiagnosis', `breaks.found.${index}.kind`],
        message: `The diagnosis is serous retinal detachment; break ${index + 1} is recorded on detached retina.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'break in serous detachment',
        fields: 'endOfCase.postoperativeDiagnosis',
        record: {
          breaks: { found: [{ kind: 'horseshoe', onDetachedRetina: true }] },
          endOfCase: { postoperativeDiagnosis: 'serous' },
        },
      },
    ],
    silent: [
      {
        name: 'an old hole in attached retina',
        record: {
          before: { diagnosis: 'serous' },
          breaks: { found: [{ kind: 'round-hole', onDetachedRetina: false }] },
        },
      },
      {
        name: 'thought serous, found rhegmatogenous',
        record: {
          before: { diagnosis: 'serous' },
          breaks: { found: [{ kind: 'horseshoe', onDetachedRetina: true }] },
          endOfCase: { postoperativeDiagnosis: 'rhegmatogenous' },
        },
      },
    ],
    unknown: [
      {
        name: 'not said whether detached',
        record: {
          endOfCase: { postoperativeDiagnosis: 'serous' },
          breaks: { found: [{ kind: 'round-hole' }] },
        },
      },
    ],
  },
});
