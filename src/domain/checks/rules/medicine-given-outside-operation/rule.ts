import { defineRule } from '../../define-rule.ts';
import { dateWords, medicinesOf, minutesBetween } from '../../facts.ts';

export const rule = defineRule({
  id: 'medicine-given-outside-operation',
  family: 'medicines',
  level: 'contradiction',
  title: 'A medicine at the end given on another day',
  why: 'Times of medicines are part of the record.',
  source: { text: 'Calendar', certainty: 'P' },
  answerable: false,
  check: (record) => {
    const start = record.who?.startedAt;
    if (start === undefined) return [];
    return medicinesOf(record).flatMap(({ drug, givenAt }, index) => {
      if (givenAt === undefined) return [];
      const minutes = minutesBetween(start, givenAt);
      if (minutes >= -240 && minutes <= 16 * 60) return [];
      return [
        {
          fields: [`endOfCase.medicines.${index}.givenAt`, 'who.startedAt'],
          message: `${drug ?? 'A medicine'} is recorded as given on ${dateWords(givenAt)} at ${givenAt.slice(11)}; the operation began on ${dateWords(start)} at ${start.slice(11)}.`,
        },
      ];
    });
  },
  examples: {
    fires: [
      {
        name: 'a week later',
        fields: 'endOfCase.medicines.0.givenAt',
        record: {
          who: { startedAt: '2026-12-01T10:00' },
          endOfCase: { medicines: [{ drug: 'Cefuroxime', givenAt: '2026-12-08T10:50' }] },
        },
      },
    ],
    silent: [
      {
        name: 'at the end',
        record: {
          who: { startedAt: '2026-12-01T10:00' },
          endOfCase: { medicines: [{ drug: 'Cefuroxime', givenAt: '2026-12-01T10:50' }] },
        },
      },
    ],
    unknown: [
      {
        name: 'no time',
        record: {
          who: { startedAt: '2026-12-01T10:00' },
          endOfCase: { medicines: [{ drug: 'Cefuroxime' }] },
        },
      },
    ],
  },
});
