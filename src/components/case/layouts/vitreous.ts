import { is, isNot, type Layout, one, type Row } from './row.ts';

const gases = ['SF6', 'C2F6', 'C3F8'];
const oils = ['silicone-oil', 'heavy-oil'];

export const vitreousLayouts: Readonly<Record<string, Layout>> = {
  vitreous: {
    usual: [
      ...one('vitrectomy'),
      {
        label: 'Ports',
        fields: ['ports', 'gauge', 'sclerotomiesMm'],
        between: ['', '', 'at'],
        when: isNot('vitrectomy', false),
      },
      ...['hyaloid', 'baseShaved', 'heavyLiquid'].map(
        (name): Row => ({ fields: [name], when: isNot('vitrectomy', false) }),
      ),
      {
        fields: ['heavyLiquidVolumeMl', 'heavyLiquidRemovalPlannedOn'],
        label: 'Heavy liquid',
        between: ['', 'out on'],
        when: (value) => !['none', undefined].includes(value('heavyLiquid') as string | undefined),
      },
      ...['dyes', 'membranesPeeled', 'retinotomies', 'lensWork', 'sclerotomyClosure'].map(
        (name): Row => ({ fields: [name], when: isNot('vitrectomy', false) }),
      ),
      { fields: ['lensImplant'], when: isNot('lensWork', 'none', undefined) },
    ],
  },
  'vitreous.dyes': { usual: [{ fields: ['kind', 'purpose'], between: ['', 'for'] }] },
  'vitreous.retinotomies': {
    usual: [
      {
        fields: ['kind', 'fromClock', 'toClock', 'treatedBy'],
        between: ['', 'from', 'to', ''],
        unitless: ['fromClock'],
      },
    ],
  },
  'vitreous.lensImplant': {
    usual: [
      {
        fields: ['form', 'powerDioptres', 'position', 'lot', 'expiresOn', 'axialLengthUsedMm'],
        between: ['', '', '', 'lot', 'expiry', 'axial length'],
      },
    ],
  },
  tamponade: {
    usual: [
      ...one('agent'),
      { fields: ['mixing'], when: is('agent', ...gases) },
      { label: 'Concentration', fields: ['concentrationPercent'], when: is('agent', ...gases) },
      {
        label: 'Mixed',
        fields: ['pureMl', 'syringeMl'],
        between: ['pure', 'in'],
        when: is('agent', ...gases),
      },
      { fields: ['viscosityCentistokes'], when: is('agent', ...oils) },
      {
        label: 'Volume, fill',
        fields: ['volumeMl', 'fillPercent'],
        between: ['', ''],
        when: isNot('agent', 'none'),
      },
      { fields: ['exchange'], when: isNot('agent', 'none', 'air') },
      {
        label: 'Lot, expiry',
        fields: ['lot', 'expiresOn'],
        between: ['', ''],
        when: isNot('agent', 'none', 'air'),
      },
      { label: 'Iridectomy', fields: ['iridectomy'], when: is('agent', ...oils) },
    ],
    more: [
      { label: 'Paracentesis', fields: ['paracentesis', 'paracentesisVolumeMl'], between: ['', ''] },
      ...one('injectedAtClock'),
    ],
  },
};
