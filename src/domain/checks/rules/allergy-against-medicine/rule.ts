import { defineRule } from '../../define-rule.ts';
import { allergiesOf, capital } from '../../facts.ts';
import { givenIn, isSameMedicine } from '../../given.ts';

export const rule = defineRule({
  id: 'allergy-against-medicine',
  family: 'medicines',
  level: 'contradiction',
  title: 'A medicine that the patient is allergic to',
  why: 'An allergy that is on record and ignored is harm that was foreseen.',
  source: { text: 'Trade practice', certainty: 'P' },
  answerable: false,
  check: (record) => {
    const substances = allergiesOf(record).flatMap(({ substance }) =>
      substance === undefined ? [] : [substance],
    );
    if (substances.length === 0) return [];
    return givenIn(record).flatMap(({ drug, field, verb }) => {
      const allergy = substances.find((substance) => isSameMedicine(substance, drug));
      if (allergy === undefined) return [];
      return [
        {
          fields: [field, 'who.patient.allergies'],
          message: `${capital(drug)} is recorded as ${verb}; the patient is allergic to ${allergy}.`,
        },
      ];
    });
  },
  examples: {
    fires: [
      {
        name: 'the same drug',
        fields: 'aftercare.drops.0.drug',
        record: {
          who: { patient: { allergies: [{ substance: 'chloramphenicol' }] } },
          aftercare: { drops: [{ drug: 'Chloramphenicol' }] },
        },
      },
      {
        name: 'iodine',
        fields: 'anaesthesia.antisepsis',
        record: {
          who: { patient: { allergies: [{ substance: 'Iodine' }] } },
          anaesthesia: { antisepsis: 'povidone-iodine' },
        },
      },
      {
        name: 'one of the class',
        fields: 'endOfCase.medicines.0.drug',
        record: {
          who: { patient: { allergies: [{ substance: 'cephalosporins' }] } },
          endOfCase: { medicines: [{ drug: 'Cefuroxime' }] },
        },
      },
      {
        name: 'in the block',
        fields: 'anaesthesia.agents.0.drug',
        record: {
          who: { patient: { allergies: [{ substance: 'lidocaine' }] } },
          anaesthesia: { agents: [{ drug: 'Lidocaine' }] },
        },
      },
    ],
    silent: [
      {
        name: 'another class',
        record: {
          who: { patient: { allergies: [{ substance: 'penicillin' }] } },
          aftercare: { drops: [{ drug: 'Chloramphenicol' }] },
        },
      },
      {
        name: 'iodinated contrast is not the antiseptic',
        record: {
          who: { patient: { allergies: [{ substance: 'iodine contrast medium' }] } },
          anaesthesia: { antisepsis: 'povidone-iodine' },
        },
      },
      {
        name: 'latex',
        record: {
          who: { patient: { allergies: [{ substance: 'latex' }] } },
          endOfCase: { medicines: [{ drug: 'Cefuroxime' }] },
        },
      },
      {
        name: 'a salt named like another class',
        record: {
          who: { patient: { allergies: [{ substance: 'morphine sulphate' }] } },
          aftercare: { tablets: [{ drug: 'Acetazolamide' }] },
        },
      },
    ],
    unknown: [
      { name: 'allergies not recorded', record: { aftercare: { drops: [{ drug: 'Chloramphenicol' }] } } },
    ],
  },
});
