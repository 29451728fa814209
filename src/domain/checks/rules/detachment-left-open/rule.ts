import { defineRule } from '../../define-rule.ts';
import { labelOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'detachment-left-open',
  family: 'tamponade',
  level: 'omission',
  title: 'A detachment with breaks, and neither a buckle nor a tamponade',
  why: 'Something has to close the break; if laser alone walled it off, the note says so.',
  source: { text: 'Trade practice', certainty: 'P' },
  answerable: true,
  unless: ['break-unsupported'],
  check: (record) => {
    const diagnosis = record.endOfCase?.postoperativeDiagnosis ?? record.before?.diagnosis;
    const detached =
      diagnosis === 'rhegmatogenous' ||
      diagnosis === 'giant-tear' ||
      diagnosis === 'dialysis' ||
      diagnosis === 'combined';
    if (!detached || record.buckle?.elements !== 'none' || record.tamponade?.agent !== 'none') return [];
    if (record.who?.performed?.some((one) => one === 'element-removal' || one === 'oil-removal') === true)
      return [];
    if (record.vitreous?.heavyLiquid === 'left') return [];
    return [
      {
        fields: ['tamponade.agent', 'buckle.elements'],
        message: `The diagnosis is ${labelOf('before.diagnosis', diagnosis)}; elements and tamponade are both recorded as none.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'neither',
        fields: 'tamponade.agent',
        record: {
          before: { diagnosis: 'rhegmatogenous' },
          buckle: { elements: 'none' },
          tamponade: { agent: 'none' },
        },
      },
    ],
    silent: [
      {
        name: 'buckle alone',
        record: {
          before: { diagnosis: 'rhegmatogenous' },
          buckle: { elements: [{ role: 'segment' }] },
          tamponade: { agent: 'none' },
        },
      },
      {
        name: 'laser to breaks without detachment',
        record: {
          before: { diagnosis: 'break-without-detachment' },
          buckle: { elements: 'none' },
          tamponade: { agent: 'none' },
        },
      },
    ],
    unknown: [
      {
        name: 'tamponade not recorded',
        record: { before: { diagnosis: 'rhegmatogenous' }, buckle: { elements: 'none' } },
      },
    ],
  },
});
