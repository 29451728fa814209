import { defineRule } from '../../define-rule.ts';

export const rule = defineRule({
  id: 'anaesthetist-missing',
  family: 'team',
  level: 'omission',
  title: 'General anaesthesia or sedation without an anaesthetist',
  why: 'Who gave the anaesthetic is part of the operative note.',
  source: { text: 'Royal College of Surgeons of England, Good Surgical Practice 2014', certainty: 'R2' },
  answerable: true,
  check: ({ anaesthesia, who }) => {
    const general = anaesthesia?.kind === 'general';
    if (!general && anaesthesia?.sedation !== true) return [];
    if (who?.anaesthetist !== undefined && !(general && who.anaesthetist === 'none')) return [];
    const what = general ? 'General anaesthesia' : 'Sedation';
    return [
      {
        fields: ['who.anaesthetist'],
        message: `${what} is recorded; the anaesthetist is ${who?.anaesthetist === 'none' ? 'recorded as none' : 'not recorded'}.`,
      },
    ];
  },
  examples: {
    fires: [
      { name: 'not recorded', fields: 'who.anaesthetist', record: { anaesthesia: { kind: 'general' } } },
      {
        name: 'none',
        fields: 'who.anaesthetist',
        record: { anaesthesia: { kind: 'general' }, who: { anaesthetist: 'none' } },
      },
    ],
    silent: [
      { name: 'named', record: { anaesthesia: { kind: 'general' }, who: { anaesthetist: 'Dr Vellow' } } },
    ],
    unknown: [{ name: 'kind not recorded', record: { who: { anaesthetist: 'none' } } }],
  },
});
