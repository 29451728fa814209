import { describe, expect, it } from 'vitest';
import { readProse } from '../../../src/domain/prose/read.ts';
import type { CaseRecord } from '../../../src/domain/record/schema.ts';

const record: CaseRecord = {
  version: 1,
  who: { eye: 'left', startedAt: '2026-12-01T09:10' },
  before: {
    lens: 'phakic',
    macula: 'off',
    axialLengthMm: 24.3,
    detachmentFromClock: 12.5,
    detachmentToClock: 5,
    pvr: { grade: 'none' },
  },
  breaks: {
    found: [
      { kind: 'horseshoe', clock: 2, quadrant: 'superotemporal' },
      { kind: 'round-hole', clock: 4.5 },
    ],
  },
  buckle: {
    elements: [
      {
        role: 'encircling',
        form: 'band',
        material: 'solid-silicone',
        widthMm: 3.5,
        thicknessMm: 0.75,
        frontEdgeReference: 'insertions',
        frontEdgeMm: 3,
        shortenedMm: 5,
        fixation: [{ quadrant: 'superotemporal', kind: 'mattress-suture', material: 'nylon' }],
      },
    ],
  },
  vitreous: { vitrectomy: true, ports: 3, gauge: '25', sclerotomiesMm: 4 },
  drainage: { kind: 'none' },
  retinopexy: { treatments: [{ modality: 'cryo', targets: 'all-breaks' }] },
  tamponade: { agent: 'SF6', concentrationPercent: 20 },
  endOfCase: { complications: 'none', pressureMmHg: 18, specimens: 'none' },
  aftercare: {
    posture: [{ position: 'right-side', days: 5 }],
    drops: [{ drug: 'dexamethasone', strength: '0.1%', timesADay: 4, weeks: 4 }],
    shieldNights: 14,
    reviewAt: '2026-12-03T09:00',
  },
};

const kinds = (text: string) => readProse(text, record).map(({ kind, words }) => `${kind}: ${words}`);

describe('readProse', () => {
  it.each([
    ['Right pars plana vitrectomy was performed.', ['side: Right pars plana']],
    ['Surgery to the RE went well.', ['side: RE']],
    ['OD vitrectomy under general anaesthesia.', ['side: OD']],
    ['The vitreous was exchanged for 14% C3F8.', ['concentration: 14% C3F8', 'agent: C3F8']],
    ['Air was exchanged for 24% SF6.', ['concentration: 24% SF6']],
    ['Sulphur hexafluoride at 30 per cent was used.', ['concentration: Sulphur hexafluoride at 30 per cent']],
    ['A horseshoe tear lay at 10 o’clock.', ['clock-hour: 10 o’clock']],
    ['The retina was detached from 6 to 9 o’clock.', ['clock-hour: 6 to 9 o’clock']],
    ['An inferonasal hole was found.', ['quadrant: inferonasal']],
    ['The band was shortened by 8 mm.', ['length: shortened by 8 mm']],
    ['Its front edge was 2,5 mm behind the insertions.', ['length: 2,5 mm behind the insertions']],
    ['A 2.5 × 0.75 mm solid silicone band was passed.', ['length: 2.5 × 0.75 mm solid silicone band']],
    ['Three breaks were found.', ['count: Three breaks']],
    ['A single tear was found.', []],
    ['It was held with 5-0 polyester.', ['material: polyester']],
    ['The eye was pseudophakic.', ['lens: pseudophakic']],
    ['A macula-on detachment.', ['macula: macula-on']],
    ['She is to lie face down for 5 days.', ['posture: face down']],
    ['Right side down for ten days.', ['duration: for ten days']],
    ['Review on 10 December 2026.', ['date: 10 December 2026']],
    ['Dexamethasone twice a day for 4 weeks.', ['medicine: twice a day']],
    ['Subretinal fluid was drained externally.', ['negation: Subretinal fluid was drained']],
    ['No cryotherapy was applied.', ['negation: cryotherapy']],
    ['There was no gas.', ['negation: no gas']],
  ])('marks the words that the record denies: %s', (text, expected) => {
    expect(kinds(text)).toEqual(expected);
  });

  it.each([
    'Left pars plana vitrectomy with encircling band, cryotherapy and 20% SF6.',
    'The fellow right eye has lattice at 10 o’clock.',
    'She had a previous right vitrectomy with C3F8.',
    'If the retina detaches again, silicone oil will be used.',
    'Some fluid was left at the right edge.',
    'The referrer wrote “right macula-on detachment”.',
    'Fluid–air exchange was completed and the air exchanged for SF6.',
    'There was no drainage and there were no complications.',
    'A horseshoe tear lay at 2 o’clock and a round hole at 4:30.',
    'Both breaks lay on the band.',
    'Lie on the right side for 5 days.',
    'Dexamethasone 0.1% four times a day for 4 weeks.',
    'There was no PVR.',
    'We considered C3F8 but chose SF6.',
    'Watch for complications.',
    'Silicone sleeve joined the ends superonasally.',
  ])('stays silent: %s', (text) => {
    expect(kinds(text)).toEqual([]);
  });

  it('says which field denies the words and what it holds', () => {
    expect(readProse('A macula-on detachment.', record)[0]).toEqual({
      kind: 'macula',
      start: 2,
      end: 11,
      words: 'macula-on',
      field: 'before.macula',
      recorded: 'macula off',
    });
  });

  it('says nothing of an empty record', () => {
    expect(readProse('Right vitrectomy, 14% C3F8, face down, tear at 3 o’clock.', { version: 1 })).toEqual(
      [],
    );
  });
});
