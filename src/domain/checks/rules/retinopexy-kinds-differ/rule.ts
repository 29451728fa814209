import { defineRule } from '../../define-rule.ts';
import { breaksOf, labelOf, listWords, treatmentsOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'retinopexy-kinds-differ',
  family: 'retinopexy',
  level: 'contradiction',
  title: 'Break and retinopexy name different treatments',
  why: 'Laser holds within a day, cryotherapy later: posture and the next reader rely on it.',
  source: { text: 'Laser holds from about a day; cryo is weaker in the first week', certainty: 'R' },
  answerable: false,
  check: (record) => {
    const treatments = record.retinopexy?.treatments;
    if (treatments === undefined) return [];
    const all = treatmentsOf(record);
    if (all.some(({ modality }) => modality === undefined)) return [];
    const given = new Set(
      all.map(({ modality }) => (modality === 'cryo' || modality === 'diathermy' ? modality : 'laser')),
    );
    return breaksOf(record).flatMap(({ treatedBy }, index) => {
      const absent = (treatedBy ?? []).filter((one) => one !== 'none' && !given.has(one));
      if (absent.length === 0) return [];
      const message = `Break ${index + 1} is recorded as treated by ${listWords(absent.map((one) => labelOf('breaks.found.treatedBy', one)))}; the retinopexy recorded is ${given.size === 0 ? 'none' : listWords([...given].map((one) => labelOf('breaks.found.treatedBy', one)))}.`;
      return [{ fields: [`breaks.found.${index}.treatedBy`, 'retinopexy.treatments'], message }];
    });
  },
  examples: {
    fires: [
      {
        name: 'laser against cryo',
        fields: 'breaks.found.0.treatedBy',
        record: {
          breaks: { found: [{ treatedBy: ['laser'] }] },
          retinopexy: { treatments: [{ modality: 'cryo' }] },
        },
      },
    ],
    silent: [
      {
        name: 'the same',
        record: {
          breaks: { found: [{ treatedBy: ['cryo'] }] },
          retinopexy: { treatments: [{ modality: 'cryo' }] },
        },
      },
    ],
    unknown: [{ name: 'retinopexy not recorded', record: { breaks: { found: [{ treatedBy: ['laser'] }] } } }],
  },
});
