import { defineRule } from '../../define-rule.ts';
import { freeTextFindings } from '../../free-text.ts';

export const rule = defineRule({
  id: 'free-text-names-other-eye',
  family: 'side',
  level: 'contradiction',
  title: 'Free text speaks of this operation on the other eye',
  why: 'Of 100 ophthalmic notes 32 transposed the side; most of it stands in free text.',
  source: { text: 'Elghrably, Eye 2008;22:340', certainty: 'R' },
  answerable: false,
  check: (record) =>
    record.who?.eye === undefined
      ? []
      : freeTextFindings(record)
          .filter(({ kind }) => kind === 'side')
          .map(({ field, words, recorded }) => ({
            fields: [field, 'who.eye'],
            message: `“${words}” stands in free text; the record says ${recorded}.`,
          })),
  examples: {
    fires: [
      {
        name: 'indication for the other eye',
        fields: 'before.indication',
        record: {
          who: { eye: 'left' },
          before: { indication: 'Right retinal detachment with the macula threatened.' },
        },
      },
    ],
    silent: [
      {
        name: 'the same eye',
        record: { who: { eye: 'left' }, before: { indication: 'Left retinal detachment.' } },
      },
      {
        name: 'history of the fellow eye',
        record: {
          who: { eye: 'left' },
          before: { indication: 'The fellow right eye was lost to detachment in 2019.' },
        },
      },
      {
        name: 'left as a verb',
        record: { who: { eye: 'right' }, endOfCase: { remarks: 'A little fluid was left inferiorly.' } },
      },
    ],
    unknown: [{ name: 'eye not recorded', record: { before: { indication: 'Right retinal detachment.' } } }],
  },
});
