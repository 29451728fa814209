import { is, isNot, type Layout, one } from './row.ts';

export const buckleLayouts: Readonly<Record<string, Layout>> = {
  buckle: { usual: one('elements', 'peritomy', 'muscleSlings', 'conjunctivalClosure') },
  'buckle.elements': {
    usual: [
      {
        fields: ['role'],
        short: {
          encircling: 'encircling',
          segment: 'segment',
          meridional: 'radial',
          'under-band': 'under band',
        },
      },
      { label: 'Element', fields: ['material', 'form'], between: ['', ''] },
      {
        label: 'Size',
        fields: ['widthMm', 'thicknessMm', 'lengthMm'],
        between: ['', '×', 'length'],
        unitless: ['widthMm'],
      },
      {
        label: 'Front edge',
        fields: ['frontEdgeMm', 'frontEdgeReference'],
        between: ['', ''],
      },
      { fields: ['meridianClock'], when: is('role', 'meridional') },
      {
        label: 'Arc',
        fields: ['fromClock', 'toClock'],
        between: ['from', 'clockwise to'],
        when: isNot('role', 'encircling', 'meridional'),
      },
      ...one('fixation'),
      { fields: ['closure'], when: is('role', 'encircling', undefined) },
      { fields: ['shortenedMm'], when: is('role', 'encircling', undefined) },
      {
        label: 'Pressure then',
        fields: ['pressureWhileTensioningMmHg', 'pressureSetBy'],
        between: ['', ''],
        when: is('role', 'encircling', undefined),
      },
      { label: 'Height, stay', fields: ['heightMm', 'intention'], between: ['', ''] },
      {
        label: 'Lot, expiry',
        fields: ['lot', 'expiresOn', 'catalogueNumber'],
        between: ['', '', 'cat. no.'],
      },
    ],
    more: one('underMuscles', 'imbricatedOver', 'frontEdgeByQuadrantMm'),
  },
  'buckle.elements.fixation': {
    usual: [
      {
        fields: ['quadrant', 'kind', 'material', 'gauge', 'biteMm', 'overDetachedRetina'],
        between: ['', '', '', 'size', 'bite', 'over detached retina'],
        sizes: { gauge: 4, biteMm: 3 },
      },
    ],
  },
  'buckle.elements.closure': {
    usual: [
      {
        fields: ['kind', 'quadrant', 'material', 'endsMatch'],
        between: ['', '', '', 'cut ends match'],
      },
    ],
  },
  'buckle.elements.frontEdgeByQuadrantMm': {
    usual: [
      {
        fields: ['superotemporal', 'superonasal', 'inferonasal', 'inferotemporal'],
        between: ['superotemporal', 'superonasal', 'inferonasal', 'inferotemporal'],
      },
    ],
  },
};
