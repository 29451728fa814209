import { defineRule } from '../../define-rule.ts';
import { elementsOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'retina-detached-at-end',
  family: 'aftercare',
  level: 'caution',
  title: 'The retina is still detached at the end, and the next operation is not planned',
  why: 'Fluid may yet go over a good buckle; otherwise the next reader asks what was meant to happen.',
  source: { text: 'Trade practice', certainty: 'P' },
  answerable: true,
  check: (record) => {
    if (record.endOfCase?.retina !== 'detached' || record.aftercare === undefined) return [];
    if (record.aftercare.nextOperationOn !== undefined || record.tamponade?.exchange === 'injection')
      return [];
    if (record.drainage?.kind === 'none' && elementsOf(record).length > 0) return [];
    return [
      {
        fields: ['endOfCase.retina', 'aftercare.nextOperationOn'],
        message: 'The retina is recorded as still detached at the end; no further operation is planned.',
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'after drainage',
        fields: 'endOfCase.retina',
        record: {
          drainage: { kind: 'internal' },
          endOfCase: { retina: 'detached' },
          aftercare: { reviewInDays: 1 },
        },
      },
    ],
    silent: [
      {
        name: 'a buckle without drainage',
        record: {
          buckle: { elements: [{ role: 'segment' }] },
          drainage: { kind: 'none' },
          endOfCase: { retina: 'detached' },
          aftercare: { reviewInDays: 1 },
        },
      },
    ],
    unknown: [{ name: 'aftercare not recorded', record: { endOfCase: { retina: 'detached' } } }],
  },
});
