import { defineRule } from '../../define-rule.ts';
import { gasOf, labelOf, oilOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'gas-without-posture',
  family: 'posture',
  level: 'omission',
  title: 'Gas without a word on posture',
  why: 'A bubble closes a break only where it lies.',
  source: { text: 'Posture puts the break uppermost', certainty: 'P' },
  answerable: true,
  check: (record) => {
    const agent = record.tamponade?.agent;
    if (
      (gasOf(record) === undefined && oilOf(record) === undefined) ||
      record.aftercare?.posture !== undefined
    )
      return [];
    return [
      {
        fields: ['aftercare.posture'],
        message: `${labelOf('tamponade.agent', agent ?? '').replace(/^./, (c) => c.toUpperCase())} is left in the eye; no posture is recorded, nor that none is needed.`,
      },
    ];
  },
  examples: {
    fires: [{ name: 'SF6', fields: 'aftercare.posture', record: { tamponade: { agent: 'SF6' } } }],
    silent: [
      { name: 'none needed, said', record: { tamponade: { agent: 'SF6' }, aftercare: { posture: 'none' } } },
    ],
    unknown: [{ name: 'no agent recorded', record: { tamponade: { fillPercent: 80 } } }],
  },
});
