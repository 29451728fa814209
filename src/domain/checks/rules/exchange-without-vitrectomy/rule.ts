import { defineRule } from '../../define-rule.ts';
import { labelOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'exchange-without-vitrectomy',
  family: 'tamponade',
  level: 'contradiction',
  title: 'A fluid exchange in an eye that still has its vitreous',
  why: 'Without vitrectomy gas is injected; the way decides the code.',
  source: { text: 'CPT 67108 against 67110', certainty: 'R' },
  answerable: false,
  check: (record) => {
    const exchange = record.tamponade?.exchange;
    const history = record.before?.previousOperations;
    if (
      exchange === undefined ||
      exchange === 'injection' ||
      record.vitreous?.vitrectomy !== false ||
      history === undefined
    )
      return [];
    if (
      Array.isArray(history) &&
      history.some(({ what }) => what === undefined || what === 'vitrectomy' || what === 'other')
    )
      return [];
    return [
      {
        fields: ['tamponade.exchange', 'vitreous.vitrectomy'],
        message: `The tamponade is recorded as put in by ${labelOf('tamponade.exchange', exchange)}; there was no vitrectomy, in this operation or before.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'no vitrectomy',
        fields: 'tamponade.exchange',
        record: {
          before: { previousOperations: 'none' },
          vitreous: { vitrectomy: false },
          tamponade: { agent: 'SF6', exchange: 'fluid-air-gas' },
        },
      },
    ],
    silent: [
      {
        name: 'in an eye without vitreous',
        record: {
          before: { previousOperations: [{ what: 'vitrectomy' }] },
          vitreous: { vitrectomy: false },
          tamponade: { agent: 'SF6', exchange: 'fluid-air-gas' },
        },
      },
      {
        name: 'injected',
        record: {
          before: { previousOperations: 'none' },
          vitreous: { vitrectomy: false },
          tamponade: { agent: 'SF6', exchange: 'injection' },
        },
      },
    ],
    unknown: [
      {
        name: 'history not recorded',
        record: { vitreous: { vitrectomy: false }, tamponade: { agent: 'SF6', exchange: 'fluid-air-gas' } },
      },
    ],
  },
});
