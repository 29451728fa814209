import { defineRule } from '../../define-rule.ts';
import { allergiesOf, dropsOf, medicinesOf, tabletsOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'allergy-against-medicine',
  family: 'medicines',
  level: 'contradiction',
  title: 'A medicine that the patient is allergic to',
  why: 'An allergy that is on record and ignored is harm that was foreseen.',
  source: { text: 'Trade practice', certainty: 'P' },
  answerable: false,
  check: (record) => {
    const allergies = allergiesOf(record).flatMap(({ substance }) =>
      substance === undefined ? [] : [substance.toLowerCase()],
    );
    if (allergies.length === 0) return [];
    const classes: readonly (readonly [RegExp, RegExp])[] = [
      [/penicillin|amoxicillin|flucloxacillin/, /penicillin|amoxicillin|flucloxacillin|co-amoxiclav/],
      [/cephalosporin|cefuroxime|cefazolin/, /cef\w+|cephal\w+/],
      [/iodine|povidone/, /povidone|iodine/],
      [/chlorhexidine/, /chlorhexidine/],
      [/sulph?a|sulfonamide|sulphonamide/, /acetazolamide|dorzolamide|brinzolamide|sulf\w+mide/],
      [/aminoglycoside|gentamicin|neomycin/, /gentamicin|neomycin|tobramycin/],
      [/quinolone|floxacin/, /\w+floxacin/],
      [/nsaid|aspirin|ibuprofen/, /aspirin|ibuprofen|ketorolac|diclofenac|bromfenac|nepafenac/],
    ];
    const given = [
      ...medicinesOf(record).map(({ drug }, index) => ({ drug, field: `endOfCase.medicines.${index}.drug` })),
      ...dropsOf(record).map(({ drug }, index) => ({ drug, field: `aftercare.drops.${index}.drug` })),
      ...tabletsOf(record).map(({ drug }, index) => ({ drug, field: `aftercare.tablets.${index}.drug` })),
      { drug: record.anaesthesia?.antisepsis, field: 'anaesthesia.antisepsis' },
    ];
    return given.flatMap(({ drug, field }) => {
      const name = drug?.toLowerCase();
      if (name === undefined || name === 'none') return [];
      const allergy = allergies.find(
        (substance) =>
          name.includes(substance) || classes.some(([of, covers]) => of.test(substance) && covers.test(name)),
      );
      return allergy === undefined
        ? []
        : [
            {
              fields: [field, 'who.patient.allergies'],
              message: `${drug?.replace(/^./, (c) => c.toUpperCase())} is recorded as given or prescribed; the patient is allergic to ${allergy}.`,
            },
          ];
    });
  },
  examples: {
    fires: [
      {
        name: 'the same substance',
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
    ],
    silent: [
      {
        name: 'another class',
        record: {
          who: { patient: { allergies: [{ substance: 'penicillin' }] } },
          aftercare: { drops: [{ drug: 'Chloramphenicol' }] },
        },
      },
    ],
    unknown: [
      { name: 'allergies not recorded', record: { aftercare: { drops: [{ drug: 'Chloramphenicol' }] } } },
    ],
  },
});
