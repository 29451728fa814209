import { is, isNot, type Layout, one } from './row.ts';

export const beforeLayouts: Readonly<Record<string, Layout>> = {
  before: {
    usual: [
      ...one('diagnosis'),
      { label: 'Macula', fields: ['macula'] },
      { fields: ['maculaOffDays'], when: isNot('macula', 'on') },
      {
        label: 'Detached',
        fields: ['detachmentFromClock', 'detachmentToClock', 'totalDetachment'],
        between: ['from', 'clockwise to', 'total'],
        unitless: ['detachmentFromClock', 'detachmentToClock'],
      },
      { label: 'PVD', fields: ['posteriorVitreousDetachment'] },
      { label: 'PVR', fields: ['pvr.edition', 'pvr.grade', 'pvr.clockHours'], between: ['', '', ''] },
      ...one('lens'),
      {
        label: 'Eye',
        fields: ['axialLengthMm', 'acuity', 'pressureMmHg'],
        between: ['length', 'acuity', 'pressure'],
      },
      ...one('symptomsSince', 'previousOperations', 'anticoagulants', 'fellowEye'),
    ],
    more: [
      ...one('recurrent', 'indication', 'quadrantsDetached', 'vitreousHaemorrhage', 'choroidalDetachment'),
      {
        label: 'Refraction',
        fields: ['sphericalEquivalentDioptres', 'keratometryDioptres'],
        between: ['', 'K'],
      },
      ...one('axialLengthMeasuredOn'),
    ],
  },
  'before.previousOperations': {
    usual: [{ fields: ['what', 'eye', 'on', 'note'], between: ['', '', 'on', 'note'] }],
  },
  'before.anticoagulants': { usual: [{ fields: ['drug', 'action'], between: ['', ''] }] },
  anaesthesia: {
    usual: [
      ...one('kind', 'sedation'),
      { fields: ['blockEye'], when: isNot('kind', 'general', 'topical') },
      { fields: ['agents'], when: isNot('kind', 'general') },
      { fields: ['nitrousOxideUsed'], when: is('kind', 'general', undefined) },
      { fields: ['nitrousOxideStoppedAt'], when: is('nitrousOxideUsed', true) },
      ...one('antisepsis'),
    ],
  },
  'anaesthesia.agents': {
    usual: [{ fields: ['drug', 'concentrationPercent', 'volumeMl'], between: ['', '', ''] }],
  },
};
