import { defineRule } from '../../define-rule.ts';
import { labelOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'block-eye-missing',
  family: 'side',
  level: 'omission',
  title: 'A block without the eye blocked',
  why: 'Of 143 confusions in eye surgery 14% were a block of the wrong eye.',
  source: { text: 'Parikh, Ophthalmology 2020;127:296', certainty: 'R' },
  answerable: true,
  check: ({ anaesthesia }) => {
    const { kind, blockEye } = anaesthesia ?? {};
    const isBlock = kind === 'sub-tenon' || kind === 'peribulbar' || kind === 'retrobulbar';
    return isBlock && blockEye === undefined
      ? [
          {
            fields: ['anaesthesia.blockEye'],
            message: `Anaesthesia was by ${labelOf('anaesthesia.kind', kind)}; the eye blocked is not recorded.`,
          },
        ]
      : [];
  },
  examples: {
    fires: [
      { name: 'peribulbar', fields: 'anaesthesia.blockEye', record: { anaesthesia: { kind: 'peribulbar' } } },
    ],
    silent: [{ name: 'recorded', record: { anaesthesia: { kind: 'peribulbar', blockEye: 'left' } } }],
    unknown: [{ name: 'kind not recorded', record: { anaesthesia: { sedation: true } } }],
  },
});
