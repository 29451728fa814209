import { is, isNot, type Layout, one } from './row.ts';

export const breaksLayouts: Readonly<Record<string, Layout>> = {
  breaks: { usual: one('found', 'lattice', 'note') },
  'breaks.found': {
    usual: [
      ...one('kind'),
      {
        label: 'Clock hour',
        fields: ['clock', 'quadrant', 'extentClockHours'],
        between: ['', '', 'extent'],
        unitless: ['clock'],
      },
      {
        label: 'Edges',
        fields: ['frontEdgeMm', 'backEdgeMm'],
        between: ['front', 'back'],
        unitless: ['frontEdgeMm'],
      },
      ...one('onDetachedRetina', 'localizedBy', 'treatedBy', 'supportedByElements'),
    ],
    more: one('zone'),
  },
  'breaks.lattice': {
    usual: [{ fields: ['fromClock', 'toClock', 'treated'], between: ['from', 'to', 'treated'] }],
  },
  drainage: {
    usual: [
      ...one('kind'),
      { fields: ['internalThrough'], when: is('kind', 'internal', 'both') },
      { fields: ['externalMethod'], when: is('kind', 'external', 'both') },
      { fields: ['clock'], when: isNot('kind', 'none') },
      { fields: ['outcome'], when: isNot('kind', 'none') },
    ],
  },
  retinopexy: { usual: one('treatments') },
  'retinopexy.treatments': {
    usual: [
      ...one('modality', 'targets'),
      { label: 'Extent', fields: ['applications', 'rows'], between: ['spots', 'rows'] },
      {
        fields: ['endpointFirstWhitening'],
        when: isNot('modality', 'endolaser', 'indirect-laser', 'slit-lamp-laser'),
      },
      {
        label: 'Settings',
        fields: ['powerMilliwatts', 'durationMilliseconds'],
        between: ['', ''],
        when: isNot('modality', 'cryo'),
      },
    ],
  },
};
