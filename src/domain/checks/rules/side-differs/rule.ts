import { defineRule } from '../../define-rule.ts';
import { listWords } from '../../facts.ts';

export const rule = defineRule({
  id: 'side-differs',
  family: 'side',
  level: 'contradiction',
  title: 'The eye differs between consent, mark, time-out, block and record',
  why: 'The wrong side is the gravest error that paper makes, and of 100 ophthalmic notes 32 transposed it.',
  source: { text: 'Elghrably, Eye 2008;22:340', certainty: 'R' },
  answerable: false,
  check: (record) => {
    const eye = record.who?.eye;
    if (eye === undefined) return [];
    const said = [
      { field: 'who.consentEye', place: 'the consent', side: record.who?.consentEye },
      { field: 'who.markedEye', place: 'the mark', side: record.who?.markedEye },
      { field: 'who.timeOutEye', place: 'the time-out', side: record.who?.timeOutEye },
      { field: 'anaesthesia.blockEye', place: 'the block', side: record.anaesthesia?.blockEye },
    ].filter(({ side }) => side !== undefined && side !== 'not-applicable' && side !== eye);
    if (said.length === 0) return [];
    const places = listWords(said.map(({ place }) => place));
    const other = eye === 'left' ? 'right' : 'left';
    const message = `The ${eye} eye is recorded as operated on; ${places} ${said.length === 1 ? 'says' : 'say'} ${other}.`;
    return [{ fields: [...said.map(({ field }) => field), 'who.eye'], message }];
  },
  examples: {
    fires: [
      {
        name: 'consent for the other eye',
        fields: 'who.consentEye',
        record: { who: { eye: 'left', consentEye: 'right' } },
      },
      {
        name: 'block in the other eye',
        fields: 'anaesthesia.blockEye',
        record: { who: { eye: 'right' }, anaesthesia: { blockEye: 'left' } },
      },
    ],
    silent: [
      {
        name: 'all the same',
        record: { who: { eye: 'left', consentEye: 'left', markedEye: 'left', timeOutEye: 'left' } },
      },
      { name: 'no block', record: { who: { eye: 'left' }, anaesthesia: { blockEye: 'not-applicable' } } },
    ],
    unknown: [
      { name: 'operated eye not recorded', record: { who: { consentEye: 'right', markedEye: 'left' } } },
    ],
  },
});
