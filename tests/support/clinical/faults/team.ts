import { general, inFamily, listAt } from './fault.ts';

const { wrong, missing } = inFamily('team');
const junior = (role: string | undefined) => role === 'trainee';

export const teamFaults = [
  missing(['surgeon-not-named', 'omission', 'No surgeon'], 'who.surgeon.name'),
  missing(['surgeon-without-role', 'omission', 'The surgeon has no role'], 'who.surgeon.role'),
  wrong(['trainee-alone', 'omission', 'A trainee without a supervisor'], (r) =>
    junior(r.who?.surgeon?.role) ? { 'who.supervisor': 'none' } : null,
  ),
  missing(
    ['supervision-not-stated', 'omission', 'A trainee operated; nobody says under whom'],
    'who.supervisor',
    (r) => junior(r.who?.surgeon?.role),
  ),
  wrong(['own-supervisor', 'contradiction', 'The surgeon is their own supervisor'], (r) =>
    typeof r.who?.supervisor === 'object' ? { 'who.supervisor.name': r.who.surgeon?.name } : null,
  ),
  missing(['supervisor-not-named', 'omission', 'A supervisor without a name'], 'who.supervisor.name'),
  missing(
    ['scrubbed-or-not', 'omission', 'Not said whether the supervisor scrubbed'],
    'who.supervisor.scrubbed',
  ),
  wrong(['surgeon-assists-themselves', 'contradiction', 'The surgeon is listed as assistant'], (r) =>
    listAt(r, 'who.assistants').length > 0 ? { 'who.assistants.0.name': r.who?.surgeon?.name } : null,
  ),
  wrong(['general-without-anaesthetist', 'contradiction', 'General anaesthesia and no anaesthetist'], (r) =>
    general(r) ? { 'who.anaesthetist': 'none' } : null,
  ),
  missing(
    ['anaesthetist-left-blank', 'omission', 'General anaesthesia; the anaesthetist is left blank'],
    'who.anaesthetist',
    general,
  ),
  wrong(['surgeon-gives-the-general', 'contradiction', 'The surgeon is also the anaesthetist'], (r) =>
    general(r) ? { 'who.anaesthetist': r.who?.surgeon?.name } : null,
  ),
  wrong(['sedation-without-anaesthetist', 'caution', 'Sedation and no anaesthetist'], (r) =>
    r.anaesthesia?.sedation === true ? { 'who.anaesthetist': 'none' } : null,
  ),
  missing(['assistants-not-stated', 'omission', 'Nothing said of assistants'], 'who.assistants'),
  wrong(['what-the-assistant-did', 'omission', 'Not said what the assistant did'], (r) =>
    listAt(r, 'who.assistants').length > 0 ? { 'who.assistants.0.did': undefined } : null,
  ),
  wrong(['assistant-without-name', 'omission', 'An assistant without a name'], (r) =>
    listAt(r, 'who.assistants').length > 0 ? { 'who.assistants.0.name': undefined } : null,
  ),
  missing(['scrub-nurse-not-named', 'omission', 'No scrub nurse'], 'who.scrubNurse'),
];
