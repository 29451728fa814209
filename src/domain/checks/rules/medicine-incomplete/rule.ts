import { defineRule } from '../../define-rule.ts';
import { listWords, medicinesOf, missingFrom } from '../../facts.ts';

export const rule = defineRule({
  id: 'medicine-incomplete',
  family: 'medicines',
  level: 'omission',
  title: 'A medicine given without its name, dose or route',
  why: 'What went into the eye, and how much, is asked when the eye reacts.',
  source: {
    text: 'Royal College of Surgeons of England, Good Surgical Practice 2014: antibiotic prophylaxis',
    certainty: 'R2',
  },
  answerable: true,
  check: (record) => {
    const missing = missingFrom(
      medicinesOf(record).flatMap(({ drug, dose, route }, index) => {
        const base = `endOfCase.medicines.${index}`;
        const name = drug ?? `medicine ${index + 1}`;
        return [
          { field: `${base}.drug`, what: `the name of ${name}`, value: drug },
          { field: `${base}.dose`, what: `the dose of ${name}`, value: dose },
          { field: `${base}.route`, what: `the route of ${name}`, value: route },
        ];
      }),
    );
    if (missing.length === 0) return [];
    return [
      {
        fields: missing.map(({ field }) => field),
        message: `Not recorded: ${listWords(missing.map(({ what }) => what))}.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'no dose',
        fields: 'endOfCase.medicines.0.dose',
        record: { endOfCase: { medicines: [{ drug: 'Cefuroxime', route: 'subconjunctival' }] } },
      },
    ],
    silent: [
      { name: 'none given', record: { endOfCase: { medicines: 'none' } } },
      {
        name: 'complete',
        record: {
          endOfCase: { medicines: [{ drug: 'Cefuroxime', dose: '125 mg', route: 'subconjunctival' }] },
        },
      },
    ],
    unknown: [{ name: 'medicines not recorded', record: { endOfCase: { retina: 'flat' } } }],
  },
});
