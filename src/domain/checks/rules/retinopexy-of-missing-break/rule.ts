import { defineRule } from '../../define-rule.ts';
import { breaksOf, listWords, treatmentsOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'retinopexy-of-missing-break',
  family: 'retinopexy',
  level: 'contradiction',
  title: 'Retinopexy to a break that is not recorded',
  why: 'Either a break is missing from the record or the treatment is.',
  source: { text: 'The record itself', certainty: 'P' },
  answerable: false,
  check: (record) => {
    if (record.breaks?.found === undefined) return [];
    const known = breaksOf(record).length;
    return treatmentsOf(record).flatMap(({ targets }, index) => {
      const missing = Array.isArray(targets) ? targets.filter((number) => number > known) : [];
      if (targets === 'all-breaks' && known === 0) {
        return [
          {
            fields: [`retinopexy.treatments.${index}.targets`, 'breaks.found'],
            message: 'Retinopexy is recorded to all breaks; no break was found.',
          },
        ];
      }
      if (missing.length === 0) return [];
      const message = `Retinopexy is recorded to break ${listWords(missing.map(String))}; ${known} ${known === 1 ? 'break is' : 'breaks are'} recorded.`;
      return [{ fields: [`retinopexy.treatments.${index}.targets`, 'breaks.found'], message }];
    });
  },
  examples: {
    fires: [
      {
        name: 'break 3 of 1',
        fields: 'retinopexy.treatments.0.targets',
        record: {
          breaks: { found: [{ clock: 2 }] },
          retinopexy: { treatments: [{ modality: 'cryo', targets: [3] }] },
        },
      },
    ],
    silent: [
      {
        name: 'break 1',
        record: {
          breaks: { found: [{ clock: 2 }] },
          retinopexy: { treatments: [{ modality: 'cryo', targets: [1] }] },
        },
      },
    ],
    unknown: [
      {
        name: 'breaks not recorded',
        record: { retinopexy: { treatments: [{ modality: 'cryo', targets: [3] }] } },
      },
    ],
  },
});
