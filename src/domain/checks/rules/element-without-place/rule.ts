import { defineRule } from '../../define-rule.ts';
import { elementsOf, labelOf, listWords, missingFrom } from '../../facts.ts';

export const rule = defineRule({
  id: 'element-without-place',
  family: 'buckle',
  level: 'omission',
  title: 'A segment without its clock hours, or a meridional element without its meridian',
  why: 'Whether it holds the break can only be told from where it lies.',
  source: { text: 'RC.02.01.03: technique and findings', certainty: 'R' },
  answerable: true,
  check: (record) =>
    elementsOf(record).flatMap(({ role, fromClock, toClock, meridianClock }, index) => {
      const base = `buckle.elements.${index}`;
      const missing = missingFrom(
        role === 'segment'
          ? [
              { field: `${base}.fromClock`, what: 'from where', value: fromClock },
              { field: `${base}.toClock`, what: 'to where', value: toClock },
            ]
          : role === 'meridional'
            ? [{ field: `${base}.meridianClock`, what: 'its meridian', value: meridianClock }]
            : [],
      );
      if (missing.length === 0) return [];
      return [
        {
          fields: missing.map(({ field }) => field),
          message: `Element ${index + 1} is a ${labelOf('buckle.elements.role', role ?? '')}; ${listWords(missing.map(({ what }) => what))} is not recorded.`,
        },
      ];
    }),
  examples: {
    fires: [
      {
        name: 'segment from nowhere',
        fields: 'buckle.elements.0.fromClock',
        record: { buckle: { elements: [{ role: 'segment' }] } },
      },
      {
        name: 'radial element without meridian',
        fields: 'buckle.elements.0.meridianClock',
        record: { buckle: { elements: [{ role: 'meridional', lengthMm: 8 }] } },
      },
    ],
    silent: [
      { name: 'band', record: { buckle: { elements: [{ role: 'encircling' }] } } },
      {
        name: 'segment placed',
        record: { buckle: { elements: [{ role: 'segment', fromClock: 9, toClock: 1 }] } },
      },
    ],
    unknown: [{ name: 'role not recorded', record: { buckle: { elements: [{ widthMm: 4 }] } } }],
  },
});
