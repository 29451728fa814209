import { defineRule } from '../../define-rule.ts';
import { allergiesOf, medicinesOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'cephalosporin-after-penicillin-allergy',
  family: 'medicines',
  level: 'caution',
  title: 'A cephalosporin in a patient allergic to penicillin',
  why: 'A few react to both; many units give it all the same.',
  source: { text: 'Trade practice', certainty: 'P' },
  answerable: true,
  check: (record) => {
    const allergic = allergiesOf(record).some(({ substance = '' }) =>
      /penicillin|amoxicillin/i.test(substance),
    );
    if (!allergic) return [];
    return medicinesOf(record).flatMap(({ drug = '' }, index) =>
      /^cef|^ceph/i.test(drug)
        ? [
            {
              fields: [`endOfCase.medicines.${index}.drug`, 'who.patient.allergies'],
              message: `${drug} was given; the patient is allergic to penicillin.`,
            },
          ]
        : [],
    );
  },
  examples: {
    fires: [
      {
        name: 'cefuroxime',
        fields: 'endOfCase.medicines.0.drug',
        record: {
          who: { patient: { allergies: [{ substance: 'penicillin' }] } },
          endOfCase: { medicines: [{ drug: 'Cefuroxime' }] },
        },
      },
    ],
    silent: [
      {
        name: 'gentamicin',
        record: {
          who: { patient: { allergies: [{ substance: 'penicillin' }] } },
          endOfCase: { medicines: [{ drug: 'Gentamicin' }] },
        },
      },
    ],
    unknown: [
      { name: 'allergies not recorded', record: { endOfCase: { medicines: [{ drug: 'Cefuroxime' }] } } },
    ],
  },
});
