import { defineRule } from '../../define-rule.ts';
import { breaksOf, labelOf, treatmentsOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'macular-hole-burned',
  family: 'retinopexy',
  level: 'caution',
  title: 'Retinopexy to a macular hole',
  why: 'Laser or cryotherapy at the fovea costs the centre of sight; the hole is usually closed by peeling and gas.',
  source: { text: 'Trade practice', certainty: 'P' },
  answerable: true,
  check: (record) =>
    breaksOf(record).flatMap(({ kind, treatedBy }, index) => {
      if (kind !== 'macular-hole') return [];
      const named = treatmentsOf(record).findIndex(
        ({ targets }) => Array.isArray(targets) && targets.includes(index + 1),
      );
      const by = treatedBy?.find((one) => one !== 'none');
      if (by === undefined && named < 0) return [];
      return [
        {
          fields: [
            by === undefined ? `retinopexy.treatments.${named}.targets` : `breaks.found.${index}.treatedBy`,
          ],
          message: `Break ${index + 1} is a macular hole, and is recorded as treated by ${by === undefined ? labelOf('retinopexy.treatments.modality', treatmentsOf(record)[named]?.modality ?? '') || 'retinopexy' : labelOf('breaks.found.treatedBy', by)}.`,
        },
      ];
    }),
  examples: {
    fires: [
      {
        name: 'laser',
        fields: 'breaks.found.0.treatedBy',
        record: { breaks: { found: [{ kind: 'macular-hole', treatedBy: ['laser'] }] } },
      },
    ],
    silent: [
      { name: 'not treated', record: { breaks: { found: [{ kind: 'macular-hole', treatedBy: ['none'] }] } } },
    ],
    unknown: [{ name: 'kind not recorded', record: { breaks: { found: [{ treatedBy: ['laser'] }] } } }],
  },
});
