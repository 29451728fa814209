import { defineRule } from '../../define-rule.ts';
import { breaksOf, labelOf, listWords, treatmentsOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'treated-break-not-among-targets',
  family: 'retinopexy',
  level: 'contradiction',
  title: 'A break is recorded as treated, and the retinopexy of that kind went to other breaks',
  why: 'A break that is only thought to be treated opens when the tamponade has gone.',
  source: { text: 'The record itself', certainty: 'P' },
  answerable: false,
  unless: ['retinopexy-kinds-differ', 'retinopexy-of-missing-break'],
  check: (record) => {
    const all = treatmentsOf(record);
    if (
      all.length === 0 ||
      all.some(({ modality, targets }) => modality === undefined || !Array.isArray(targets))
    )
      return [];
    const kindOf = (modality: string | undefined) =>
      modality === 'cryo' || modality === 'diathermy' ? modality : 'laser';
    return breaksOf(record).flatMap(({ treatedBy }, index) => {
      const bare = (treatedBy ?? []).find(
        (one) =>
          one !== 'none' &&
          all.some(({ modality }) => kindOf(modality) === one) &&
          !all.some(
            ({ modality, targets }) =>
              kindOf(modality) === one && Array.isArray(targets) && targets.includes(index + 1),
          ),
      );
      if (bare === undefined) return [];
      const at = all.findIndex(({ modality }) => kindOf(modality) === bare);
      const targets = all[at]?.targets;
      const name = labelOf('breaks.found.treatedBy', bare);
      return [
        {
          fields: [`breaks.found.${index}.treatedBy`, `retinopexy.treatments.${at}.targets`],
          message: `Break ${index + 1} is recorded as treated by ${name}; ${name} is recorded to break ${listWords((Array.isArray(targets) ? targets : []).map(String))}.`,
        },
      ];
    });
  },
  examples: {
    fires: [
      {
        name: 'the other break',
        fields: 'breaks.found.1.treatedBy',
        record: {
          breaks: { found: [{ treatedBy: ['laser'] }, { treatedBy: ['laser'] }] },
          retinopexy: { treatments: [{ modality: 'endolaser', targets: [1] }] },
        },
      },
    ],
    silent: [
      {
        name: 'each its own',
        record: {
          breaks: { found: [{ treatedBy: ['laser'] }, { treatedBy: ['cryo'] }] },
          retinopexy: {
            treatments: [
              { modality: 'endolaser', targets: [1] },
              { modality: 'cryo', targets: [2] },
            ],
          },
        },
      },
      {
        name: '360°',
        record: {
          breaks: { found: [{ treatedBy: ['laser'] }] },
          retinopexy: { treatments: [{ modality: 'endolaser', targets: 'circumferential' }] },
        },
      },
    ],
    unknown: [
      {
        name: 'targets not recorded',
        record: {
          breaks: { found: [{ treatedBy: ['laser'] }] },
          retinopexy: { treatments: [{ modality: 'endolaser' }] },
        },
      },
    ],
  },
});
