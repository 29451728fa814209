import { defineRule } from '../../define-rule.ts';
import { breaksOf, listWords, treatmentsOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'break-without-retinopexy',
  family: 'retinopexy',
  level: 'omission',
  title: 'A break without retinopexy',
  why: 'A break without retinopexy is held only as long as what presses on it.',
  source: { text: 'A break without retinopexy recorded is an omission', certainty: 'P' },
  answerable: true,
  check: (record) => {
    const treatments = record.retinopexy?.treatments;
    // While nothing at all is said of retinopexy, that is what is missing.
    if (treatments === undefined && breaksOf(record).every(({ treatedBy }) => treatedBy === undefined))
      return [];
    const all = treatmentsOf(record);
    if (
      all.some(
        ({ targets }) => targets === 'all-breaks' || targets === 'circumferential' || targets === undefined,
      )
    )
      return [];
    const named = new Set(all.flatMap(({ targets }) => (Array.isArray(targets) ? targets : [])));
    const bare = breaksOf(record).flatMap(({ treatedBy, kind }, index) => {
      const treated =
        treatedBy?.some((one) => one !== 'none') === true || named.has(index + 1) || kind === 'macular-hole';
      return treated ? [] : [index];
    });
    if (bare.length === 0) return [];
    const which = `${bare.length === 1 ? 'Break' : 'Breaks'} ${listWords(bare.map((index) => String(index + 1)))}`;
    const message = `${which}: no retinopexy is recorded.`;
    return [
      {
        fields: [
          treatments === undefined ? 'retinopexy.treatments' : `breaks.found.${bare[0]}.treatedBy`,
          ...bare.map((index) => `breaks.found.${index}.treatedBy`),
        ],
        message,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'none',
        fields: 'breaks.found.0.treatedBy',
        record: { breaks: { found: [{ clock: 2 }] }, retinopexy: { treatments: 'none' } },
      },
      {
        name: 'one of two',
        fields: 'breaks.found.1.treatedBy',
        record: {
          breaks: { found: [{ clock: 2 }, { clock: 5 }] },
          retinopexy: { treatments: [{ modality: 'cryo', targets: [1] }] },
        },
      },
      {
        name: 'said of the break',
        fields: 'retinopexy.treatments',
        record: { breaks: { found: [{ clock: 2, treatedBy: ['none'] }] } },
      },
    ],
    silent: [
      {
        name: 'cryo to all',
        record: {
          breaks: { found: [{ clock: 2 }] },
          retinopexy: { treatments: [{ modality: 'cryo', targets: 'all-breaks' }] },
        },
      },
      { name: 'macular hole', record: { breaks: { found: [{ kind: 'macular-hole' }] } } },
    ],
    unknown: [
      { name: 'no break recorded', record: { retinopexy: { treatments: 'none' } } },
      { name: 'nothing said of retinopexy', record: { breaks: { found: [{ clock: 2 }] } } },
    ],
  },
});
