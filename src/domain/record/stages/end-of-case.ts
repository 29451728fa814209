import {
  choice,
  choices,
  dateTime,
  group,
  listOrNone,
  longText,
  quantity,
  sides,
  text,
  yesNo,
} from '../fields.ts';
import { before } from './before.ts';

const complication = group('Complication', {
  kind: choice('Complication', {
    'iatrogenic-break': 'iatrogenic break',
    'choroidal-haemorrhage': 'choroidal haemorrhage',
    'choroidal-detachment': 'choroidal detachment',
    'subretinal-haemorrhage': 'subretinal haemorrhage',
    'scleral-perforation': 'scleral perforation',
    'retinal-incarceration': 'retinal incarceration',
    'lens-touch': 'lens touch',
    'subretinal-heavy-liquid': 'heavy liquid under the retina',
    'subretinal-gas': 'gas under the retina',
    'vitreous-haemorrhage': 'vitreous haemorrhage',
    'high-pressure': 'high pressure',
    'corneal-oedema': 'corneal oedema',
    'arterial-occlusion': 'central retinal artery not perfused',
    other: 'other',
  }),
  detail: text('Detail'),
  action: text('What was done'),
});

const medicine = group('Medicine', {
  drug: text('Drug'),
  dose: text('Dose'),
  route: choice('Route', {
    subconjunctival: 'subconjunctival',
    intracameral: 'intracameral',
    intravitreal: 'intravitreal',
    'sub-tenon': 'sub-Tenon',
    topical: 'topical',
    oral: 'oral',
    intravenous: 'intravenous',
  }),
  eye: choice('Eye', sides),
  givenAt: dateTime('Given at'),
});

export const endOfCase = group('End of case', {
  postoperativeDiagnosis: before.shape.diagnosis.unwrap().meta({
    ...before.shape.diagnosis.unwrap().meta(),
    title: 'Postoperative diagnosis',
  }),
  retina: choice('Retina', {
    flat: 'flat',
    'fluid-left': 'some subretinal fluid left',
    detached: 'still detached',
  }),
  fluidLeftWhere: text('Fluid left where'),
  breaksClosed: choice('Breaks on the buckle or flat', { all: 'all', some: 'some', none: 'none' }),
  pressureMmHg: quantity('Pressure at the end', 'mmHg', 0, 100),
  pressureBy: choice('Pressure judged by', { tonometer: 'tonometer', palpation: 'palpation' }),
  discPerfused: yesNo('Optic disc perfused'),
  complications: listOrNone('Complications', 'complication', complication),
  bloodLoss: choice('Blood loss', { none: 'none', minimal: 'minimal', measured: 'measured' }),
  bloodLossMl: quantity('Blood loss', 'mL', 0, 2000),
  specimens: listOrNone(
    'Specimens',
    'specimen',
    group('Specimen', { what: text('Specimen'), sentTo: text('Sent to') }),
  ),
  counts: choice('Counts', { correct: 'correct', discrepancy: 'discrepancy', 'not-done': 'not done' }),
  countsNote: text('What was done about the discrepancy'),
  medicines: listOrNone('Medicines given', 'medicine', medicine),
  thrombosisProphylaxis: choice('Thrombosis prophylaxis', {
    'not-indicated': 'assessed, none needed',
    mechanical: 'mechanical',
    medicine: 'medicine',
  }),
  shield: yesNo('Pad and shield on'),
  extraSteps: longText('Extra steps and why'),
  remarks: longText('Remarks'),
  tissue: choices('Tissue removed', {
    none: 'none',
    vitreous: 'vitreous',
    membrane: 'membrane',
    lens: 'lens',
  }),
});
