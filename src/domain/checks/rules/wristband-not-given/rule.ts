import { defineRule } from '../../define-rule.ts';
import { longGasOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'wristband-not-given',
  family: 'aftercare',
  level: 'caution',
  title: 'A long-lasting gas, and no wristband given',
  why: 'Sight was lost 10 days to a month after surgery; a bracelet tells the anaesthetist who cannot ask.',
  source: { text: 'Hart, AJO 2002;134:761', certainty: 'R' },
  answerable: true,
  check: (record) => {
    const gas = longGasOf(record);
    if (gas === undefined || record.aftercare?.wristband !== false) return [];
    return [
      {
        fields: ['aftercare.wristband', 'tamponade.agent'],
        message: `${gas} is left in the eye; the wristband is recorded as not given.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'not given',
        fields: 'aftercare.wristband',
        record: { tamponade: { agent: 'C3F8' }, aftercare: { wristband: false } },
      },
    ],
    silent: [
      { name: 'air', record: { tamponade: { agent: 'air' }, aftercare: { wristband: false } } },
      { name: 'given', record: { tamponade: { agent: 'C3F8' }, aftercare: { wristband: true } } },
    ],
    unknown: [{ name: 'tamponade not recorded', record: { aftercare: { wristband: false } } }],
  },
});
