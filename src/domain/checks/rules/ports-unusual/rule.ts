import { defineRule } from '../../define-rule.ts';
import { numberIn } from '../../facts.ts';

export const rule = defineRule({
  id: 'ports-unusual',
  family: 'vitreous',
  level: 'caution',
  title: 'A vitrectomy through an unusual number of ports',
  why: 'Infusion, light and cutter need three; a fourth is for a second light.',
  source: { text: 'Trade practice', certainty: 'P' },
  answerable: true,
  check: ({ vitreous }) => {
    const ports = numberIn(vitreous?.ports);
    if (vitreous?.vitrectomy !== true || ports === undefined || (ports >= 2 && ports <= 5)) return [];
    return [
      {
        fields: ['vitreous.ports'],
        message: `A vitrectomy is recorded through ${ports} ${ports === 1 ? 'port' : 'ports'}.`,
      },
    ];
  },
  examples: {
    fires: [
      { name: 'no port', fields: 'vitreous.ports', record: { vitreous: { vitrectomy: true, ports: 0 } } },
    ],
    silent: [{ name: 'four with a chandelier', record: { vitreous: { vitrectomy: true, ports: 4 } } }],
    unknown: [{ name: 'ports not recorded', record: { vitreous: { vitrectomy: true } } }],
  },
});
