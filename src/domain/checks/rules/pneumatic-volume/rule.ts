import { pneumaticMl } from '../../../physics/gas.ts';
import { defineRule } from '../../define-rule.ts';
import { gasOf, numberWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'pneumatic-volume',
  family: 'tamponade',
  level: 'caution',
  title: 'An unusual volume for a pneumatic retinopexy',
  why: 'Too much pure gas closes the artery, too little misses the break.',
  source: { text: 'SF6 0.5 mL, C3F8 0.3 mL, air 0.5–1.0 mL pure', certainty: 'R' },
  answerable: true,
  unless: ['pure-gas-at-full-fill'],
  check: (record) => {
    const gas = gasOf(record);
    const volume = record.tamponade?.volumeMl;
    if (
      record.who?.performed?.includes('pneumatic-retinopexy') !== true ||
      gas === undefined ||
      volume === undefined
    )
      return [];
    const usual = pneumaticMl[gas];
    if (usual === undefined || (volume >= usual[0] - 0.1 && volume <= usual[1] + 0.15)) return [];
    const range = usual[0] === usual[1] ? `${usual[0]} mL` : `${usual[0]}–${usual[1]} mL`;
    return [
      {
        fields: ['tamponade.volumeMl'],
        message: `${numberWords(volume)} mL of ${gas === 'air' ? 'air' : gas} is recorded for a pneumatic retinopexy; ${range} is usual.`,
      },
    ];
  },
  examples: {
    fires: [
      {
        name: '1 mL of C3F8',
        fields: 'tamponade.volumeMl',
        record: { who: { performed: ['pneumatic-retinopexy'] }, tamponade: { agent: 'C3F8', volumeMl: 1 } },
      },
    ],
    silent: [
      {
        name: '0.3 mL',
        record: { who: { performed: ['pneumatic-retinopexy'] }, tamponade: { agent: 'C3F8', volumeMl: 0.3 } },
      },
    ],
    unknown: [
      {
        name: 'volume not recorded',
        record: { who: { performed: ['pneumatic-retinopexy'] }, tamponade: { agent: 'C3F8' } },
      },
    ],
  },
});
