import { defineRule } from '../../define-rule.ts';
import { breaksOf, elementsOf, labelOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'element-supports-nothing',
  family: 'buckle',
  level: 'caution',
  title: 'A local element on which no break is recorded',
  why: 'A segment or radial element is put where a break is; the break or its support may be missing.',
  source: { text: 'Trade practice', certainty: 'P' },
  answerable: true,
  unless: ['supported-by-missing-element'],
  check: (record) => {
    const found = breaksOf(record);
    if (found.length === 0 || found.some(({ supportedByElements }) => supportedByElements === undefined))
      return [];
    const named = new Set(
      found.flatMap(({ supportedByElements }) =>
        Array.isArray(supportedByElements) ? supportedByElements : [],
      ),
    );
    return elementsOf(record).flatMap(({ role }, index) =>
      (role === 'segment' || role === 'meridional') && !named.has(index + 1)
        ? [
            {
              fields: [`buckle.elements.${index}.role`, 'breaks.found'],
              message: `Element ${index + 1} is a ${labelOf('buckle.elements.role', role)}; no break is recorded on it.`,
            },
          ]
        : [],
    );
  },
  examples: {
    fires: [
      {
        name: 'nothing on it',
        fields: 'buckle.elements.1.role',
        record: {
          breaks: { found: [{ clock: 10, supportedByElements: [1] }] },
          buckle: { elements: [{ role: 'encircling' }, { role: 'meridional', meridianClock: 5 }] },
        },
      },
    ],
    silent: [
      {
        name: 'a break on each',
        record: {
          breaks: { found: [{ clock: 10, supportedByElements: [1, 2] }] },
          buckle: { elements: [{ role: 'encircling' }, { role: 'meridional' }] },
        },
      },
    ],
    unknown: [
      {
        name: 'support not recorded',
        record: { breaks: { found: [{ clock: 10 }] }, buckle: { elements: [{ role: 'meridional' }] } },
      },
    ],
  },
});
