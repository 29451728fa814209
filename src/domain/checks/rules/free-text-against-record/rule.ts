import { defineRule } from '../../define-rule.ts';
import { freeTextFindings } from '../../free-text.ts';

export const rule = defineRule({
  id: 'free-text-against-record',
  family: 'standards',
  level: 'caution',
  title: 'Free text and a recorded fact do not agree',
  why: 'The fields make the letters and the codes, the free text is read as well; a reader finds both.',
  source: { text: 'The record itself', certainty: 'P' },
  answerable: true,
  check: (record) =>
    freeTextFindings(record)
      .filter(({ kind }) => kind !== 'side')
      .map(({ field, words, recorded, recordedIn }) => ({
        fields: [field, recordedIn],
        message: `“${words}” stands in free text; the record says ${recorded}.`,
      })),
  examples: {
    fires: [
      {
        name: 'another gas',
        fields: 'endOfCase.remarks',
        record: {
          tamponade: { agent: 'SF6', concentrationPercent: 20 },
          endOfCase: { remarks: 'C3F8 was left in the eye.' },
        },
      },
    ],
    silent: [
      {
        name: 'the same gas',
        record: { tamponade: { agent: 'SF6' }, endOfCase: { remarks: 'SF6 was left in the eye.' } },
      },
    ],
    unknown: [
      { name: 'tamponade not recorded', record: { endOfCase: { remarks: 'C3F8 was left in the eye.' } } },
    ],
  },
});
