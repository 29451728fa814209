import { defineRule } from '../../define-rule.ts';
import { breaksOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'giant-tear-without-pvd',
  family: 'diagnosis',
  level: 'contradiction',
  title: 'A giant tear with the vitreous attached',
  why: 'Without posterior vitreous detachment a tear of that size is a dialysis, which is treated otherwise.',
  source: {
    text: 'A giant tear comes with posterior vitreous detachment; a dialysis is not one',
    certainty: 'R',
  },
  answerable: false,
  check: (record) => {
    const index = breaksOf(record).findIndex(({ kind }) => kind === 'giant-tear');
    if (index < 0 || record.before?.posteriorVitreousDetachment !== 'none') return [];
    const message = `Break ${index + 1} is called a giant retinal tear, and the posterior vitreous is recorded as not detached.`;
    return [{ fields: [`breaks.found.${index}.kind`, 'before.posteriorVitreousDetachment'], message }];
  },
  examples: {
    fires: [
      {
        name: 'no detachment of the vitreous',
        fields: 'breaks.found.0.kind',
        record: {
          before: { posteriorVitreousDetachment: 'none' },
          breaks: { found: [{ kind: 'giant-tear' }] },
        },
      },
    ],
    silent: [
      {
        name: 'detached',
        record: {
          before: { posteriorVitreousDetachment: 'complete' },
          breaks: { found: [{ kind: 'giant-tear' }] },
        },
      },
    ],
    unknown: [
      {
        name: 'could not be told',
        record: {
          before: { posteriorVitreousDetachment: 'unknown' },
          breaks: { found: [{ kind: 'giant-tear' }] },
        },
      },
    ],
  },
});
