/** How sure an entry is: read in the source, read second-hand, or from memory. What is not read is shown as "confirm". */
export type Certainty = 'R' | 'R2' | 'M';

export type CodeSetName = 'ICD-10-CM' | 'CPT' | 'OPCS-4';

export interface CodeEntry {
  /** Our own words; the licensed wording is not shipped. */
  title: string;
  certainty: Certainty;
}

interface CodeSet {
  /** Stated with every export. */
  version: string;
  source: string;
  entries: Readonly<Record<string, CodeEntry>>;
}

const read = (title: string): CodeEntry => ({ title, certainty: 'R' });
const remembered = (title: string): CodeEntry => ({ title, certainty: 'M' });

/** Versioned as data: a new year is a new version, and old case sheets keep theirs. */
export const codeSets: Readonly<Record<CodeSetName, CodeSet>> = {
  'ICD-10-CM': {
    version: '2026-12-01',
    source: 'ICD-10-CM, chapter 7, retinal detachments and breaks',
    entries: {
      'H33.00': read('retinal detachment with break, unspecified'),
      'H33.01': read('retinal detachment with one break'),
      'H33.02': read('retinal detachment with several breaks'),
      'H33.03': read('retinal detachment with giant tear'),
      'H33.04': read('retinal detachment with dialysis'),
      'H33.05': read('total retinal detachment'),
      'H33.30': read('retinal break without detachment, unspecified'),
      'H33.31': read('horseshoe tear without detachment'),
      'H33.32': read('round hole without detachment'),
      'H33.33': read('several breaks without detachment'),
      'H33.4': read('traction detachment'),
      'H33.2': read('serous detachment'),
      'H43.1': read('vitreous haemorrhage'),
    },
  },
  CPT: {
    version: '2026-12-01',
    source: 'CPT numbers with paraphrases of our own; the wording is licensed',
    entries: {
      '67101': read('repair of detachment by cryotherapy or diathermy'),
      '67105': read('repair of detachment by laser'),
      '67107': read('repair of detachment by scleral buckle, with or without cryotherapy, laser, drainage'),
      '67108': read(
        'repair of detachment by vitrectomy, with or without gas, laser, cryotherapy, drainage, buckle, lens removal',
      ),
      '67110': read('repair of detachment by injection of gas'),
      '67113': read('repair of complex detachment by vitrectomy and membrane peeling'),
      '67115': remembered('release of an encircling element'),
      '67120': remembered('removal of an implant from outside the eye'),
      '67121': read('removal of an implant from inside the eye'),
      '67036': read('vitrectomy for another reason'),
      '67141': remembered('prophylaxis of detachment by cryotherapy or diathermy'),
      '67145': remembered('prophylaxis of detachment by laser'),
    },
  },
  'OPCS-4': {
    version: '2026-12-01',
    source: 'OPCS-4, from memory',
    entries: {
      'C79.2': remembered('pars plana vitrectomy'),
      'C79.5': remembered('gas into the vitreous cavity'),
      'C79.6': remembered('oil into the vitreous cavity'),
      C54: remembered('buckling operation for the attachment of the retina'),
      C81: remembered('laser to the retina'),
      'Z94.2': remembered('right side'),
      'Z94.3': remembered('left side'),
    },
  },
};

export const notice =
  'Proposals only. Confirm each code and modifier against a licensed, current code book; the descriptions are our own.';
