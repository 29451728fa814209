import { z } from 'zod';
import {
  choice,
  choices,
  date,
  dateTime,
  group,
  listOrNone,
  longText,
  sides,
  text,
  yesNo,
} from '../fields.ts';
import { procedures } from '../procedures.ts';

const allergy = group('Allergy', { substance: text('Substance'), reaction: text('Reaction') });

const assistant = group('Assistant', { name: text('Name'), role: text('Role'), did: text('What was done') });

export const who = group('Who and which eye', {
  patient: group('Patient', {
    familyName: text('Family name'),
    givenName: text('Given name'),
    dateOfBirth: date('Date of birth'),
    number: text('Record number'),
    allergies: listOrNone('Allergies', 'allergy', allergy),
  }),
  eye: choice('Eye operated on', sides),
  consentEye: choice('Eye on the consent', sides),
  markedEye: choice('Eye marked', sides),
  timeOutEye: choice('Eye read out at the time-out', sides),
  timeOutAt: dateTime('Time-out'),
  urgency: choice('Urgency', { elective: 'elective', urgent: 'urgent', emergency: 'emergency' }),
  planned: choices('Procedures planned', procedures),
  performed: choices('Procedures performed', procedures),
  whyChanged: longText('Why the plan was changed'),
  startedAt: dateTime('Operation started'),
  endedAt: dateTime('Operation ended'),
  theatre: text('Theatre'),
  surgeon: group('Surgeon', { name: text('Name'), role: text('Role') }),
  supervisor: z
    .union([z.literal('none'), group('Supervisor', { name: text('Name'), scrubbed: yesNo('Scrubbed') })])
    .meta({ title: 'Supervisor', item: 'supervisor' }),
  assistants: listOrNone('Assistants', 'assistant', assistant),
  anaesthetist: z
    .union([z.literal('none'), text('Name')])
    .meta({ title: 'Anaesthetist', item: 'anaesthetist' }),
  scrubNurse: text('Scrub nurse'),
  referrer: group('Referred by', {
    name: text('Name'),
    kind: choice('Profession', {
      optometrist: 'optometrist',
      ophthalmologist: 'ophthalmologist',
      'family-doctor': 'family doctor',
      'emergency-department': 'emergency department',
      self: 'came without referral',
    }),
    referredOn: date('Referred on'),
  }),
  familyDoctor: text('Family doctor'),
});
