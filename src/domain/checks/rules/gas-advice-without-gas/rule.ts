import { defineRule } from '../../define-rule.ts';
import { gasOf, labelOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'gas-advice-without-gas',
  family: 'aftercare',
  level: 'caution',
  title: 'Advice for gas, and no gas in the eye',
  why: 'Either the tamponade or the advice is a slip, and the patient is held back from flying.',
  source: { text: 'The record itself', certainty: 'P' },
  answerable: true,
  check: (record) => {
    const agent = record.tamponade?.agent;
    const { flyingAdviceGiven, wristband, nitrousOxideAdviceGiven } = record.aftercare ?? {};
    if (agent === undefined || gasOf(record) !== undefined) return [];
    if (flyingAdviceGiven !== true && wristband !== true && nitrousOxideAdviceGiven !== true) return [];
    const field =
      flyingAdviceGiven === true
        ? 'aftercare.flyingAdviceGiven'
        : wristband === true
          ? 'aftercare.wristband'
          : 'aftercare.nitrousOxideAdviceGiven';
    return [
      {
        fields: [field, 'tamponade.agent'],
        message: `The patient was advised as for gas; the tamponade is ${labelOf('tamponade.agent', agent)}.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'oil',
        fields: 'aftercare.flyingAdviceGiven',
        record: { tamponade: { agent: 'silicone-oil' }, aftercare: { flyingAdviceGiven: true } },
      },
    ],
    silent: [
      { name: 'gas', record: { tamponade: { agent: 'SF6' }, aftercare: { flyingAdviceGiven: true } } },
    ],
    unknown: [{ name: 'agent not recorded', record: { aftercare: { flyingAdviceGiven: true } } }],
  },
});
