import { defineRule } from '../../define-rule.ts';
import { breaksOf, elementsOf, listWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'supported-by-missing-element',
  family: 'buckle',
  level: 'contradiction',
  title: 'A break is said to be supported by an element that is not recorded',
  why: 'Either the element or the break’s support is wrong.',
  source: { text: 'The record itself', certainty: 'P' },
  answerable: false,
  check: (record) => {
    const elements = record.buckle?.elements;
    if (elements === undefined) return [];
    const known = elementsOf(record).length;
    return breaksOf(record).flatMap(({ supportedByElements }, index) => {
      const missing = Array.isArray(supportedByElements)
        ? supportedByElements.filter((number) => number > known)
        : [];
      if (missing.length === 0) return [];
      const message = `Break ${index + 1} is said to lie on element ${listWords(missing.map(String))}; ${known === 0 ? 'no element is recorded' : `${known} ${known === 1 ? 'element is' : 'elements are'} recorded`}.`;
      return [{ fields: [`breaks.found.${index}.supportedByElements`, 'buckle.elements'], message }];
    });
  },
  examples: {
    fires: [
      {
        name: 'no buckle',
        fields: 'breaks.found.0.supportedByElements',
        record: { breaks: { found: [{ supportedByElements: [1] }] }, buckle: { elements: 'none' } },
      },
    ],
    silent: [
      {
        name: 'there is one',
        record: {
          breaks: { found: [{ supportedByElements: [1] }] },
          buckle: { elements: [{ role: 'encircling' }] },
        },
      },
    ],
    unknown: [
      { name: 'elements not recorded yet', record: { breaks: { found: [{ supportedByElements: [1] }] } } },
    ],
  },
});
