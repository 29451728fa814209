import { defineRule } from '../../define-rule.ts';
import { allergiesOf, capital } from '../../facts.ts';
import { givenIn, isRelatedMedicine, isSameMedicine } from '../../given.ts';

export const rule = defineRule({
  id: 'related-medicine-after-allergy',
  family: 'medicines',
  level: 'caution',
  title: 'A medicine related to one that the patient is allergic to',
  why: 'Few react to both, and many units give it all the same; it is worth knowing that it was seen.',
  source: { text: 'Trade practice', certainty: 'P' },
  answerable: true,
  unless: ['allergy-against-medicine', 'cephalosporin-after-penicillin-allergy'],
  check: (record) => {
    const substances = allergiesOf(record).flatMap(({ substance }) =>
      substance === undefined ? [] : [substance],
    );
    if (substances.length === 0) return [];
    return givenIn(record).flatMap(({ drug, field, verb }) => {
      const allergy = substances.find(
        (substance) => isRelatedMedicine(substance, drug) && !isSameMedicine(substance, drug),
      );
      if (allergy === undefined) return [];
      return [
        {
          fields: [field, 'who.patient.allergies'],
          message: `${capital(drug)} is recorded as ${verb}; the patient is allergic to ${allergy}, which is related.`,
        },
      ];
    });
  },
  examples: {
    fires: [
      {
        name: 'sulphonamide',
        fields: 'aftercare.tablets.0.drug',
        record: {
          who: { patient: { allergies: [{ substance: 'sulfa drugs' }] } },
          aftercare: { tablets: [{ drug: 'Acetazolamide' }] },
        },
      },
      {
        name: 'aspirin',
        fields: 'aftercare.drops.0.drug',
        record: {
          who: { patient: { allergies: [{ substance: 'aspirin' }] } },
          aftercare: { drops: [{ drug: 'Ketorolac' }] },
        },
      },
    ],
    silent: [
      {
        name: 'not related',
        record: {
          who: { patient: { allergies: [{ substance: 'sulfa drugs' }] } },
          aftercare: { drops: [{ drug: 'Prednisolone' }] },
        },
      },
    ],
    unknown: [
      {
        name: 'substance not recorded',
        record: {
          who: { patient: { allergies: [{ reaction: 'rash' }] } },
          aftercare: { tablets: [{ drug: 'Acetazolamide' }] },
        },
      },
    ],
  },
});
