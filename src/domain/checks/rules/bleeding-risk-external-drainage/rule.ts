import { defineRule } from '../../define-rule.ts';
import { listWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'bleeding-risk-external-drainage',
  family: 'drainage',
  level: 'caution',
  title: 'External drainage with anticoagulants continued',
  why: 'Drainage crosses the choroid; bleeding is its worst complication.',
  source: { text: 'Trade practice', certainty: 'P' },
  answerable: true,
  check: (record) => {
    const drugs = record.before?.anticoagulants;
    const kind = record.drainage?.kind;
    if (!Array.isArray(drugs) || (kind !== 'external' && kind !== 'both')) return [];
    const kept = drugs.flatMap(({ drug, action }) =>
      action === 'continued' && drug !== undefined && !/aspirin/i.test(drug) ? [drug] : [],
    );
    if (kept.length === 0) return [];
    return [
      {
        fields: ['before.anticoagulants', 'drainage.kind'],
        message: `Fluid was drained externally with ${listWords(kept)} continued.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'warfarin',
        fields: 'before.anticoagulants',
        record: {
          before: { anticoagulants: [{ drug: 'Warfarin', action: 'continued' }] },
          drainage: { kind: 'external' },
        },
      },
    ],
    silent: [
      {
        name: 'stopped',
        record: {
          before: { anticoagulants: [{ drug: 'Warfarin', action: 'stopped' }] },
          drainage: { kind: 'external' },
        },
      },
    ],
    unknown: [
      {
        name: 'action not recorded',
        record: { before: { anticoagulants: [{ drug: 'Warfarin' }] }, drainage: { kind: 'external' } },
      },
    ],
  },
});
