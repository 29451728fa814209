import { defineRule } from '../../define-rule.ts';
import { listWords, missingFrom } from '../../facts.ts';

export const rule = defineRule({
  id: 'required-before',
  family: 'standards',
  level: 'omission',
  title: 'Diagnosis and findings before are not complete',
  why: 'The diagnosis and the state of the macula are why the operation was done; PVR and recurrence decide the code.',
  source: {
    text: 'C-CDA Operative Note: preoperative diagnosis 10219-4; tag A-0959; CPT 67113 and modifier 78',
    certainty: 'R',
  },
  answerable: true,
  check: ({ before }) => {
    const detached = before?.diagnosis !== 'break-without-detachment';
    const missing = missingFrom([
      { field: 'before.diagnosis', what: 'the preoperative diagnosis', value: before?.diagnosis },
      { field: 'before.recurrent', what: 'first or recurrent', value: detached ? before?.recurrent : false },
      { field: 'before.macula', what: 'the macula', value: detached ? before?.macula : 'on' },
      {
        field: 'before.detachmentFromClock',
        what: 'the extent of the detachment',
        value:
          !detached || before?.totalDetachment === true
            ? true
            : (before?.detachmentFromClock ?? before?.quadrantsDetached ?? before?.detachmentToClock),
      },
      { field: 'before.pvr.grade', what: 'PVR or none', value: detached ? before?.pvr?.grade : 'none' },
      { field: 'before.lens', what: 'the lens', value: before?.lens },
    ]);
    if (missing.length === 0) return [];
    return [
      {
        fields: missing.map(({ field }) => field),
        message: `Not recorded: ${listWords(missing.map(({ what }) => what))}.`,
      },
    ];
  },
  examples: {
    fires: [{ name: 'nothing', fields: 'before.diagnosis', record: {} }],
    silent: [
      {
        name: 'complete',
        record: {
          before: {
            diagnosis: 'rhegmatogenous',
            recurrent: false,
            macula: 'on',
            lens: 'phakic',
            quadrantsDetached: 2,
            pvr: { grade: 'none' },
          },
        },
      },
      {
        name: 'break without detachment',
        record: { before: { diagnosis: 'break-without-detachment', lens: 'phakic' } },
      },
    ],
    unknown: [],
  },
});
