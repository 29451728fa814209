import { defineRule } from '../../define-rule.ts';
import { breaksOf, treatmentsOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'untreated-break-among-targets',
  family: 'retinopexy',
  level: 'contradiction',
  title: 'A break is recorded as not treated, and retinopexy as applied to it',
  why: 'Whether the break holds once the tamponade has gone depends on it.',
  source: { text: 'The record itself', certainty: 'P' },
  answerable: false,
  check: (record) =>
    breaksOf(record).flatMap(({ treatedBy }, index) => {
      if (treatedBy === undefined || treatedBy.length === 0 || treatedBy.some((one) => one !== 'none'))
        return [];
      const at = treatmentsOf(record).findIndex(
        ({ targets }) => targets === 'all-breaks' || (Array.isArray(targets) && targets.includes(index + 1)),
      );
      if (at < 0) return [];
      const to = treatmentsOf(record)[at]?.targets === 'all-breaks' ? 'all breaks' : `break ${index + 1}`;
      return [
        {
          fields: [`breaks.found.${index}.treatedBy`, `retinopexy.treatments.${at}.targets`],
          message: `Break ${index + 1} is recorded as not treated, and retinopexy as applied to ${to}.`,
        },
      ];
    }),
  examples: {
    fires: [
      {
        name: 'all breaks',
        fields: 'breaks.found.0.treatedBy',
        record: {
          breaks: { found: [{ treatedBy: ['none'] }] },
          retinopexy: { treatments: [{ modality: 'cryo', targets: 'all-breaks' }] },
        },
      },
      {
        name: 'by its number',
        fields: 'breaks.found.0.treatedBy',
        record: {
          breaks: { found: [{ treatedBy: ['none'] }] },
          retinopexy: { treatments: [{ modality: 'cryo', targets: [1] }] },
        },
      },
    ],
    silent: [
      {
        name: 'the other break',
        record: {
          breaks: { found: [{ treatedBy: ['none'] }, { treatedBy: ['cryo'] }] },
          retinopexy: { treatments: [{ modality: 'cryo', targets: [2] }] },
        },
      },
    ],
    unknown: [
      {
        name: 'targets not recorded',
        record: {
          breaks: { found: [{ treatedBy: ['none'] }] },
          retinopexy: { treatments: [{ modality: 'cryo' }] },
        },
      },
    ],
  },
});
