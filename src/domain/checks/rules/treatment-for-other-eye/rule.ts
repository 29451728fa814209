import { defineRule } from '../../define-rule.ts';
import { dropsOf, medicinesOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'treatment-for-other-eye',
  family: 'side',
  level: 'contradiction',
  title: 'Drops or medicines for the eye that was not operated on',
  why: 'Drops in the wrong eye leave the operated one untreated.',
  source: { text: 'Elghrably, Eye 2008;22:340', certainty: 'R' },
  answerable: false,
  check: (record) => {
    const eye = record.who?.eye;
    if (eye === undefined) return [];
    const drops = dropsOf(record).map((drop, index) => ({ ...drop, field: `aftercare.drops.${index}.eye` }));
    const medicines = medicinesOf(record).map((one, index) => ({
      ...one,
      field: `endOfCase.medicines.${index}.eye`,
    }));
    return [...drops, ...medicines]
      .filter((one) => one.eye !== undefined && one.eye !== eye)
      .map((one) => ({
        fields: [one.field, 'who.eye'],
        message: `${one.drug ?? 'A medicine'} is recorded for the ${one.eye} eye; the ${eye} eye was operated on.`,
      }));
  },
  examples: {
    fires: [
      {
        name: 'drop',
        fields: 'aftercare.drops.0.eye',
        record: { who: { eye: 'left' }, aftercare: { drops: [{ drug: 'Dexamethasone', eye: 'right' }] } },
      },
    ],
    silent: [
      {
        name: 'same eye',
        record: { who: { eye: 'left' }, aftercare: { drops: [{ drug: 'Dexamethasone', eye: 'left' }] } },
      },
    ],
    unknown: [
      {
        name: 'eye of the drop not recorded',
        record: { who: { eye: 'left' }, aftercare: { drops: [{ drug: 'Dexamethasone' }] } },
      },
    ],
  },
});
