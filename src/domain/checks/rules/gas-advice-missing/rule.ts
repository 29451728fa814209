import { defineRule } from '../../define-rule.ts';
import { gasOf, listWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'gas-advice-missing',
  family: 'aftercare',
  level: 'omission',
  title: 'Gas without the advice on flying, nitrous oxide or the wristband',
  why: 'Sight was lost from nitrous oxide 10 days to a month after surgery, and pressure rose from 16 to 49 mmHg at 3,000 ft.',
  source: { text: 'Hart, AJO 2002;134:761; Kokame, Retina 1994;14:356', certainty: 'R' },
  answerable: true,
  check: (record) => {
    const gas = gasOf(record);
    if (gas === undefined) return [];
    const { flyingAdviceGiven, nitrousOxideAdviceGiven, wristband } = record.aftercare ?? {};
    const missing = [
      flyingAdviceGiven === undefined
        ? { field: 'aftercare.flyingAdviceGiven', what: 'the advice on flying' }
        : undefined,
      nitrousOxideAdviceGiven === undefined
        ? { field: 'aftercare.nitrousOxideAdviceGiven', what: 'the advice on nitrous oxide' }
        : undefined,
      wristband === undefined && gas !== 'air'
        ? { field: 'aftercare.wristband', what: 'the wristband' }
        : undefined,
    ].filter((one) => one !== undefined);
    if (missing.length === 0) return [];
    return [
      {
        fields: missing.map(({ field }) => field),
        message: `${gas === 'air' ? 'Air' : gas} is left in the eye; ${listWords(missing.map(({ what }) => what))} ${missing.length === 1 ? 'is' : 'are'} not recorded.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'nothing recorded',
        fields: 'aftercare.flyingAdviceGiven',
        record: { tamponade: { agent: 'SF6' } },
      },
    ],
    silent: [
      {
        name: 'all given',
        record: {
          tamponade: { agent: 'SF6' },
          aftercare: { flyingAdviceGiven: true, nitrousOxideAdviceGiven: true, wristband: true },
        },
      },
    ],
    unknown: [{ name: 'no agent', record: { aftercare: { posture: 'none' } } }],
  },
});
