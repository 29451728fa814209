import {
  choice,
  dateTime,
  group,
  listOrNone,
  orNotApplicable,
  quantity,
  sides,
  text,
  yesNo,
} from '../fields.ts';

const agent = group('Agent', {
  drug: text('Drug'),
  concentrationPercent: quantity('Concentration', '%', 0, 100),
  volumeMl: quantity('Volume', 'mL', 0, 60),
});

export const anaesthesia = group('Anaesthesia', {
  kind: choice('Kind', {
    general: 'general',
    'sub-tenon': 'sub-Tenon block',
    peribulbar: 'peribulbar block',
    retrobulbar: 'retrobulbar block',
    topical: 'topical',
  }),
  sedation: yesNo('Sedation'),
  blockEye: orNotApplicable(choice('Eye blocked', sides)),
  agents: listOrNone('Local agents', 'agent', agent),
  nitrousOxideUsed: yesNo('Nitrous oxide used'),
  nitrousOxideStoppedAt: orNotApplicable(dateTime('Nitrous oxide stopped')),
  antisepsis: choice('Antisepsis', {
    'povidone-iodine': 'povidone-iodine',
    chlorhexidine: 'aqueous chlorhexidine',
    none: 'none',
  }),
});
