import { defineRule } from '../../define-rule.ts';
import { labelOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'block-against-anaesthesia',
  family: 'side',
  level: 'contradiction',
  title: 'A block under a kind of anaesthesia that has none, or a block that names no eye',
  why: 'Of 143 confusions in eye surgery 14% were a block of the wrong eye.',
  source: { text: 'Parikh, Ophthalmology 2020;127:296', certainty: 'R' },
  answerable: false,
  check: ({ anaesthesia }) => {
    const { kind, blockEye } = anaesthesia ?? {};
    if (kind === undefined || blockEye === undefined) return [];
    const isBlock = kind === 'sub-tenon' || kind === 'peribulbar' || kind === 'retrobulbar';
    if (isBlock && blockEye === 'not-applicable') {
      return [
        {
          fields: ['anaesthesia.blockEye', 'anaesthesia.kind'],
          message: `Anaesthesia is recorded as ${labelOf('anaesthesia.kind', kind)}, and the eye blocked as not applicable.`,
        },
      ];
    }
    if (kind === 'topical' && blockEye !== 'not-applicable') {
      return [
        {
          fields: ['anaesthesia.kind', 'anaesthesia.blockEye'],
          message: `Anaesthesia is recorded as topical, and the ${blockEye} eye as blocked.`,
        },
      ];
    }
    return [];
  },
  examples: {
    fires: [
      {
        name: 'block without an eye',
        fields: 'anaesthesia.blockEye',
        record: { anaesthesia: { kind: 'peribulbar', blockEye: 'not-applicable' } },
      },
    ],
    silent: [
      {
        name: 'general with a block for pain',
        record: { anaesthesia: { kind: 'general', blockEye: 'left' } },
      },
    ],
    unknown: [{ name: 'eye not recorded', record: { anaesthesia: { kind: 'peribulbar' } } }],
  },
});
