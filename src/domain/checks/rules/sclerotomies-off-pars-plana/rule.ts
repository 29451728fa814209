import { defineRule } from '../../define-rule.ts';
import { numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'sclerotomies-off-pars-plana',
  family: 'vitreous',
  level: 'caution',
  title: 'Sclerotomies outside the pars plana',
  why: 'Too far forward they meet the lens, too far back the retina.',
  source: { text: '3 to 4 mm behind the limbus', certainty: 'P' },
  answerable: true,
  check: ({ vitreous }) => {
    const mm = vitreous?.sclerotomiesMm;
    if (mm === undefined || (mm >= 3 && mm <= 4.5)) return [];
    return [
      {
        fields: ['vitreous.sclerotomiesMm'],
        message: `The sclerotomies are recorded ${numberWords(mm)} mm behind the limbus; 3 to 4 mm is usual.`,
      },
    ];
  },
  examples: {
    fires: [{ name: '6 mm', fields: 'vitreous.sclerotomiesMm', record: { vitreous: { sclerotomiesMm: 6 } } }],
    silent: [{ name: '3.5 mm', record: { vitreous: { sclerotomiesMm: 3.5 } } }],
    unknown: [{ name: 'not recorded', record: { vitreous: { vitrectomy: true } } }],
  },
});
