import { defineRule } from '../../define-rule.ts';
import { labelOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'needle-block-anticoagulated',
  family: 'medicines',
  level: 'caution',
  title: 'A needle block with anticoagulants continued',
  why: 'Bleeding behind the eye is the block’s worst complication.',
  source: { text: 'Trade practice', certainty: 'P' },
  answerable: true,
  check: ({ anaesthesia, before }) => {
    const kind = anaesthesia?.kind;
    const drugs = Array.isArray(before?.anticoagulants) ? before.anticoagulants : [];
    if (kind !== 'retrobulbar') return [];
    const at = drugs.findIndex(
      ({ drug = '', action }) =>
        action === 'continued' &&
        /warfarin|apixaban|rivaroxaban|dabigatran|edoxaban|heparin|phenprocoumon|acenocoumarol/i.test(drug),
    );
    if (at < 0) return [];
    return [
      {
        fields: ['anaesthesia.kind', `before.anticoagulants.${at}.action`],
        message: `Anaesthesia was by ${labelOf('anaesthesia.kind', kind)} with ${drugs[at]?.drug ?? ''} continued.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'warfarin',
        fields: 'anaesthesia.kind',
        record: {
          before: { anticoagulants: [{ drug: 'warfarin', action: 'continued' }] },
          anaesthesia: { kind: 'retrobulbar' },
        },
      },
    ],
    silent: [
      {
        name: 'sub-Tenon',
        record: {
          before: { anticoagulants: [{ drug: 'warfarin', action: 'continued' }] },
          anaesthesia: { kind: 'sub-tenon' },
        },
      },
      {
        name: 'aspirin',
        record: {
          before: { anticoagulants: [{ drug: 'aspirin', action: 'continued' }] },
          anaesthesia: { kind: 'retrobulbar' },
        },
      },
    ],
    unknown: [
      {
        name: 'not recorded whether continued',
        record: { before: { anticoagulants: [{ drug: 'warfarin' }] }, anaesthesia: { kind: 'retrobulbar' } },
      },
    ],
  },
});
