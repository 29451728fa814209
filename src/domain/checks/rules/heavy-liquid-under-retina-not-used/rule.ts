import { defineRule } from '../../define-rule.ts';
import { complicationsOf, dateWords, labelOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'heavy-liquid-under-retina-not-used',
  family: 'vitreous',
  level: 'contradiction',
  title: 'Heavy liquid under the retina or to be removed, and none left or used',
  why: 'Whether heavy liquid may still be in the eye must be certain.',
  source: { text: 'Retained under the retina in 1–11%, Shulman 2013', certainty: 'R' },
  answerable: false,
  check: (record) => {
    const liquid = record.vitreous?.heavyLiquid;
    if (liquid !== 'none' && liquid !== 'removed') return [];
    const said = labelOf('vitreous.heavyLiquid', liquid);
    const at = complicationsOf(record).findIndex(({ kind }) => kind === 'subretinal-heavy-liquid');
    if (liquid === 'none' && at >= 0) {
      return [
        {
          fields: ['vitreous.heavyLiquid', `endOfCase.complications.${at}.kind`],
          message: `Heavy liquid is recorded as ${said}, and as a complication under the retina.`,
        },
      ];
    }
    const planned = record.vitreous?.heavyLiquidRemovalPlannedOn;
    // A drop that was left under the retina may yet be taken out.
    const open = liquid === 'removed' && record.endOfCase?.complications !== 'none';
    return planned === undefined || open
      ? []
      : [
          {
            fields: ['vitreous.heavyLiquid', 'vitreous.heavyLiquidRemovalPlannedOn'],
            message: `Heavy liquid is recorded as ${said}; its removal is planned for ${dateWords(planned)}.`,
          },
        ];
  },
  examples: {
    fires: [
      {
        name: 'complication',
        fields: 'vitreous.heavyLiquid',
        record: {
          vitreous: { heavyLiquid: 'none' },
          endOfCase: { complications: [{ kind: 'subretinal-heavy-liquid' }] },
        },
      },
      {
        name: 'removal planned',
        fields: 'vitreous.heavyLiquid',
        record: {
          vitreous: { heavyLiquid: 'none', heavyLiquidRemovalPlannedOn: '2026-03-16' },
          endOfCase: { complications: 'none' },
        },
      },
    ],
    silent: [
      {
        name: 'a drop left under the retina',
        record: {
          vitreous: { heavyLiquid: 'removed' },
          endOfCase: { complications: [{ kind: 'subretinal-heavy-liquid' }] },
        },
      },
    ],
    unknown: [
      {
        name: 'use not recorded',
        record: { endOfCase: { complications: [{ kind: 'subretinal-heavy-liquid' }] } },
      },
    ],
  },
});
