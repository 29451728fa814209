import { defineRule } from '../../define-rule.ts';
import { breaksOf, labelOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'horseshoe-with-vitreous-attached',
  family: 'diagnosis',
  level: 'caution',
  title: 'A horseshoe tear with the vitreous attached',
  why: 'A flap is torn by a detaching vitreous; one of the two may be a slip.',
  source: { text: 'Trade practice', certainty: 'P' },
  answerable: true,
  check: (record) => {
    const index = breaksOf(record).findIndex(({ kind }) => kind === 'horseshoe' || kind === 'operculated');
    if (index < 0 || record.before?.posteriorVitreousDetachment !== 'none') return [];
    const kind = labelOf('breaks.found.kind', breaksOf(record)[index]?.kind ?? '');
    const message = `Break ${index + 1} is a ${kind}, and the posterior vitreous is recorded as not detached.`;
    return [{ fields: ['before.posteriorVitreousDetachment', `breaks.found.${index}.kind`], message }];
  },
  examples: {
    fires: [
      {
        name: 'attached',
        fields: 'before.posteriorVitreousDetachment',
        record: {
          before: { posteriorVitreousDetachment: 'none' },
          breaks: { found: [{ kind: 'horseshoe' }] },
        },
      },
    ],
    silent: [
      {
        name: 'round hole with attached vitreous',
        record: {
          before: { posteriorVitreousDetachment: 'none' },
          breaks: { found: [{ kind: 'round-hole' }] },
        },
      },
    ],
    unknown: [{ name: 'not recorded', record: { breaks: { found: [{ kind: 'horseshoe' }] } } }],
  },
});
