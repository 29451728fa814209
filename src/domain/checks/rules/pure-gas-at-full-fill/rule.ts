import { gasFacts } from '../../../physics/gas.ts';
import { defineRule } from '../../define-rule.ts';
import { longGasOf, numberIn, numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'pure-gas-at-full-fill',
  family: 'tamponade',
  level: 'contradiction',
  title: 'Pure or strong gas filling most of the eye',
  why: 'Pure gas grows two to four times; in a full eye it closes the artery.',
  source: {
    text: 'Royal College of Ophthalmologists safety alert, 18 December 2018: expansion of pure gases',
    certainty: 'R',
  },
  answerable: false,
  check: (record) => {
    const gas = longGasOf(record);
    const { mixing, fillPercent, volumeMl } = record.tamponade ?? {};
    const percent = mixing === 'pure' ? 100 : numberIn(record.tamponade?.concentrationPercent);
    if (gas === undefined || percent === undefined || percent < 40) return [];
    const large =
      (fillPercent !== undefined && fillPercent > 50) || (volumeMl !== undefined && volumeMl > 1.5);
    if (!large) return [];
    const fill =
      fillPercent === undefined
        ? `${numberWords(volumeMl ?? 0)} mL`
        : `a fill of ${numberWords(fillPercent)}%`;
    const message = `${numberWords(percent)}% ${gas} is recorded with ${fill}; pure ${gas} grows to about ${gasFacts[gas].expansion} times its volume.`;
    return [
      {
        fields: [
          'tamponade.concentrationPercent',
          fillPercent === undefined ? 'tamponade.volumeMl' : 'tamponade.fillPercent',
          'tamponade.mixing',
        ],
        message,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: 'pure C3F8, 95%',
        fields: 'tamponade.concentrationPercent',
        record: { tamponade: { agent: 'C3F8', mixing: 'pure', fillPercent: 95 } },
      },
    ],
    silent: [
      { name: '0.3 mL pure', record: { tamponade: { agent: 'C3F8', mixing: 'pure', volumeMl: 0.3 } } },
    ],
    unknown: [{ name: 'fill not recorded', record: { tamponade: { agent: 'C3F8', mixing: 'pure' } } }],
  },
});
