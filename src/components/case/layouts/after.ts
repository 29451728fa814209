import { is, isNot, type Layout, one } from './row.ts';

const course: Layout = {
  usual: [
    { label: 'Drug', fields: ['drug', 'strength', 'eye'], between: ['', '', ''] },
    { label: 'Course', fields: ['timesADay', 'weeks', 'note'], between: ['', 'times a day for', 'note'] },
  ],
};

export const afterLayouts: Readonly<Record<string, Layout>> = {
  endOfCase: {
    usual: [
      {
        label: 'Diagnosis after',
        fields: ['postoperativeDiagnosis'],
        sameAs: { path: 'before.diagnosis', words: 'the same as before' },
      },
      ...one('retina'),
      { fields: ['fluidLeftWhere'], when: isNot('retina', 'flat', undefined) },
      { label: 'Breaks closed', fields: ['breaksClosed'] },
      { label: 'Pressure', fields: ['pressureMmHg', 'pressureBy'], between: ['', ''] },
      ...one('discPerfused', 'complications'),
      { label: 'Blood loss', fields: ['bloodLoss'] },
      { label: 'Measured', fields: ['bloodLossMl'], when: is('bloodLoss', 'measured') },
      ...one('specimens', 'counts'),
      { fields: ['countsNote'], when: is('counts', 'discrepancy') },
      { label: 'Medicines', fields: ['medicines'] },
      { label: 'Thrombosis', fields: ['thrombosisProphylaxis'] },
      ...one('shield'),
    ],
    more: one('tissue', 'extraSteps', 'remarks'),
  },
  'endOfCase.complications': {
    usual: [{ fields: ['kind', 'detail', 'action'], between: ['', 'detail', 'done'] }],
  },
  'endOfCase.specimens': { usual: [{ fields: ['what', 'sentTo'], between: ['', 'sent to'] }] },
  'endOfCase.medicines': {
    usual: [{ fields: ['drug', 'dose', 'route', 'eye', 'givenAt'], between: ['', '', '', '', 'at'] }],
  },
  aftercare: {
    usual: [
      ...one('posture'),
      { label: 'Flying', fields: ['flyingAdviceGiven'] },
      { label: 'No flying until', fields: ['noFlyingUntil'] },
      { label: 'Nitrous oxide', fields: ['nitrousOxideAdviceGiven'] },
      ...one('wristband', 'drops'),
      { label: 'Shield at night', fields: ['shieldNights'] },
      { label: 'Warning signs', fields: ['warningSigns'] },
      { label: 'Review', fields: ['reviewAt', 'reviewInDays', 'reviewPlace'], between: ['', 'or in', 'at'] },
      ...one('goesTo'),
    ],
    more: [
      ...one('tablets', 'activity', 'driving'),
      { label: 'Oil out in', fields: ['oilRemovalInMonths'] },
      { label: 'Element out in', fields: ['elementRemovalInMonths'] },
      { label: 'Next operation', fields: ['nextOperationOn'] },
      { label: 'Glasses', fields: ['refractiveChangeTold'] },
      ...one('note'),
    ],
  },
  'aftercare.posture': {
    usual: [
      {
        fields: ['position', 'hoursADay', 'minutesAnHour', 'days'],
        between: ['', 'hours a day', 'or of each hour', 'for'],
      },
    ],
  },
  'aftercare.drops': course,
  'aftercare.tablets': {
    usual: [
      { label: 'Drug', fields: ['drug', 'strength'], between: ['', ''] },
      { label: 'Course', fields: ['timesADay', 'weeks', 'note'], between: ['', 'times a day for', 'note'] },
    ],
  },
};
