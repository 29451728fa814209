import { defineRule } from '../../define-rule.ts';
import { breaksOf, elementsOf, listWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'support-not-recorded',
  family: 'buckle',
  level: 'omission',
  title: 'A buckle, and a break without a word on what supports it',
  why: 'Which break the element was for is the point of the note.',
  source: { text: 'Trade practice', certainty: 'P' },
  answerable: true,
  check: (record) => {
    if (elementsOf(record).length === 0) return [];
    const open = breaksOf(record).flatMap(({ supportedByElements, kind }, index) =>
      supportedByElements === undefined && kind !== 'macular-hole' ? [index] : [],
    );
    if (open.length === 0) return [];
    const which = `${open.length === 1 ? 'Break' : 'Breaks'} ${listWords(open.map((index) => String(index + 1)))}`;
    const message = `${which}: which element lies under ${open.length === 1 ? 'it' : 'them'} is not recorded.`;
    return [{ fields: open.map((index) => `breaks.found.${index}.supportedByElements`), message }];
  },
  examples: {
    fires: [
      {
        name: 'not said',
        fields: 'breaks.found.0.supportedByElements',
        record: { breaks: { found: [{ clock: 2 }] }, buckle: { elements: [{ role: 'encircling' }] } },
      },
    ],
    silent: [
      {
        name: 'said',
        record: {
          breaks: { found: [{ clock: 2, supportedByElements: [1] }] },
          buckle: { elements: [{ role: 'encircling' }] },
        },
      },
    ],
    unknown: [{ name: 'no elements recorded', record: { breaks: { found: [{ clock: 2 }] } } }],
  },
});
