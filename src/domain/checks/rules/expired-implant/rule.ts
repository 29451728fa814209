import { defineRule } from '../../define-rule.ts';
import { dateWords, elementName, elementsOf, lensImplantOf, operatedOn } from '../../facts.ts';

export const rule = defineRule({
  id: 'expired-implant',
  family: 'implants',
  level: 'contradiction',
  title: 'An implant or gas had expired on the day of use',
  why: 'An expired product is either a slip in the record or an incident to report.',
  source: {
    text: 'Royal College of Surgeons of England, Good Surgical Practice 2014: prosthesis details',
    certainty: 'R2',
  },
  answerable: false,
  check: (record) => {
    const on = operatedOn(record);
    if (on === undefined) return [];
    const used = [
      ...elementsOf(record).map((element, index) => ({
        field: `buckle.elements.${index}.expiresOn`,
        what: elementName(element, index),
        date: element.expiresOn,
      })),
      { field: 'tamponade.expiresOn', what: 'The tamponade', date: record.tamponade?.expiresOn },
      {
        field: 'vitreous.lensImplant.expiresOn',
        what: 'The lens implant',
        date: lensImplantOf(record)?.expiresOn,
      },
    ];
    return used
      .filter(({ date }) => date !== undefined && date < on)
      .map(({ field, what, date = '' }) => ({
        fields: [field, 'who.startedAt'],
        message: `${what} expired on ${dateWords(date)}, before the operation on ${dateWords(on)}.`,
      }));
  },
  examples: {
    fires: [
      {
        name: 'band',
        fields: 'buckle.elements.0.expiresOn',
        record: {
          who: { startedAt: '2026-12-01T10:00' },
          buckle: { elements: [{ expiresOn: '2026-11-30' }] },
        },
      },
    ],
    silent: [
      {
        name: 'valid on its last day',
        record: {
          who: { startedAt: '2026-12-01T10:00' },
          buckle: { elements: [{ expiresOn: '2026-12-01' }] },
        },
      },
    ],
    unknown: [
      { name: 'no date of operation', record: { buckle: { elements: [{ expiresOn: '2020-01-01' }] } } },
    ],
  },
});
