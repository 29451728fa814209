import type { FieldSpec } from '../../domain/record/field-tree.ts';

/**
 * How the fields of a group stand on the page. A layout only places fields: every field of the record that no row
 * names is shown below under "more", so that none is out of reach.
 */
export interface Row {
  /** Title at the left; without it, that of the first field. */
  label?: string;
  /** Names of fields of the group, side by side. */
  fields: readonly string[];
  /** Words between the fields: the first stands before the first field. */
  between?: readonly string[];
  /** Fields whose unit is printed by a later field of the row. */
  unitless?: readonly string[];
  /** Room for a box, in characters, where the usual room is wrong. */
  sizes?: Readonly<Record<string, number>>;
  /** Shorter labels where the row says the rest. */
  short?: Readonly<Record<string, string>>;
  /** A field elsewhere whose value may be said again with one press, and the words for it. */
  sameAs?: { path: string; words: string };
  /** Whether the row is of use, given the other values of the group. A row with something recorded is always shown. */
  when?: (value: (name: string) => unknown) => boolean;
}

export interface Layout {
  usual: readonly Row[];
  /** Shown on request. */
  more?: readonly Row[];
}

const one = (...names: string[]): Row[] => names.map((name) => ({ fields: [name] }));

const is =
  (name: string, ...wanted: unknown[]): NonNullable<Row['when']> =>
  (value) =>
    wanted.includes(value(name));

const isNot =
  (name: string, ...unwanted: unknown[]): NonNullable<Row['when']> =>
  (value) =>
    !unwanted.includes(value(name));

const gases = ['SF6', 'C2F6', 'C3F8'];
const oils = ['silicone-oil', 'heavy-oil'];

const course: Layout = {
  usual: [
    { label: 'Drug', fields: ['drug', 'strength', 'eye'], between: ['', '', ''] },
    { label: 'Course', fields: ['timesADay', 'weeks', 'note'], between: ['', 'times a day for', 'note'] },
  ],
};

export const layouts: Readonly<Record<string, Layout>> = {
  who: {
    usual: [
      { label: 'Eye', fields: ['eye'] },
      { label: 'On the consent', fields: ['consentEye'] },
      { label: 'Marked', fields: ['markedEye'] },
      { label: 'At time-out', fields: ['timeOutEye', 'timeOutAt'], between: ['', 'at'] },
      ...one('urgency'),
      { fields: ['performed'], sameAs: { path: 'who.planned', words: 'as planned' } },
      { label: 'Operation', fields: ['startedAt', 'endedAt'], between: ['', 'to'] },
      { label: 'Surgeon', fields: ['surgeon.name', 'surgeon.role'], between: ['', 'as'] },
      ...one('supervisor', 'assistants', 'anaesthetist'),
      { label: 'Allergies', fields: ['patient.allergies'] },
    ],
    more: [
      { label: 'Patient', fields: ['patient.familyName', 'patient.givenName'], between: ['', ''] },
      { label: 'Born', fields: ['patient.dateOfBirth', 'patient.number'], between: ['', 'number'] },
      ...one('planned', 'whyChanged', 'theatre', 'scrubNurse'),
      {
        label: 'Referred by',
        fields: ['referrer.name', 'referrer.kind', 'referrer.referredOn'],
        between: ['', '', 'on'],
      },
      ...one('familyDoctor'),
    ],
  },
  'who.supervisor': {
    usual: [{ label: 'Supervisor', fields: ['name', 'scrubbed'], between: ['', 'scrubbed'] }],
  },
  'who.patient.allergies': { usual: [{ fields: ['substance', 'reaction'], between: ['', ''] }] },
  'who.assistants': { usual: [{ fields: ['name', 'role', 'did'], between: ['', 'as', 'did'] }] },
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
  breaks: { usual: one('found', 'lattice', 'note') },
  'breaks.found': {
    usual: [
      ...one('kind'),
      {
        label: 'Clock hour',
        fields: ['clock', 'quadrant', 'extentClockHours'],
        between: ['', '', 'extent'],
        unitless: ['clock'],
      },
      {
        label: 'Edges',
        fields: ['frontEdgeMm', 'backEdgeMm'],
        between: ['front', 'back'],
        unitless: ['frontEdgeMm'],
      },
      ...one('onDetachedRetina', 'localizedBy', 'treatedBy', 'supportedByElements'),
    ],
    more: one('zone'),
  },
  'breaks.lattice': {
    usual: [{ fields: ['fromClock', 'toClock', 'treated'], between: ['from', 'to', 'treated'] }],
  },
  buckle: { usual: one('elements', 'peritomy', 'muscleSlings', 'conjunctivalClosure') },
  'buckle.elements': {
    usual: [
      {
        fields: ['role'],
        short: {
          encircling: 'encircling',
          segment: 'segment',
          meridional: 'radial',
          'under-band': 'under band',
        },
      },
      { label: 'Element', fields: ['material', 'form'], between: ['', ''] },
      {
        label: 'Size',
        fields: ['widthMm', 'thicknessMm', 'lengthMm'],
        between: ['', '×', 'length'],
        unitless: ['widthMm'],
      },
      {
        label: 'Front edge',
        fields: ['frontEdgeMm', 'frontEdgeReference'],
        between: ['', ''],
      },
      { fields: ['meridianClock'], when: is('role', 'meridional') },
      {
        label: 'Arc',
        fields: ['fromClock', 'toClock'],
        between: ['from', 'clockwise to'],
        when: isNot('role', 'encircling', 'meridional'),
      },
      ...one('fixation'),
      { fields: ['closure'], when: is('role', 'encircling', undefined) },
      { fields: ['shortenedMm'], when: is('role', 'encircling', undefined) },
      {
        label: 'Pressure then',
        fields: ['pressureWhileTensioningMmHg', 'pressureSetBy'],
        between: ['', ''],
        when: is('role', 'encircling', undefined),
      },
      { label: 'Height, stay', fields: ['heightMm', 'intention'], between: ['', ''] },
      {
        label: 'Lot, expiry',
        fields: ['lot', 'expiresOn', 'catalogueNumber'],
        between: ['', '', 'cat. no.'],
      },
    ],
    more: one('underMuscles', 'imbricatedOver', 'frontEdgeByQuadrantMm'),
  },
  'buckle.elements.fixation': {
    usual: [
      {
        fields: ['quadrant', 'kind', 'material', 'gauge', 'biteMm', 'overDetachedRetina'],
        between: ['', '', '', 'size', 'bite', 'over detached retina'],
        sizes: { gauge: 4, biteMm: 3 },
      },
    ],
  },
  'buckle.elements.closure': {
    usual: [
      {
        fields: ['kind', 'quadrant', 'material', 'endsMatch'],
        between: ['', '', '', 'cut ends match'],
      },
    ],
  },
  'buckle.elements.frontEdgeByQuadrantMm': {
    usual: [
      {
        fields: ['superotemporal', 'superonasal', 'inferonasal', 'inferotemporal'],
        between: ['superotemporal', 'superonasal', 'inferonasal', 'inferotemporal'],
      },
    ],
  },
  vitreous: {
    usual: [
      ...one('vitrectomy'),
      {
        label: 'Ports',
        fields: ['ports', 'gauge', 'sclerotomiesMm'],
        between: ['', '', 'at'],
        when: isNot('vitrectomy', false),
      },
      ...['hyaloid', 'baseShaved', 'heavyLiquid'].map(
        (name): Row => ({ fields: [name], when: isNot('vitrectomy', false) }),
      ),
      {
        fields: ['heavyLiquidVolumeMl', 'heavyLiquidRemovalPlannedOn'],
        label: 'Heavy liquid',
        between: ['', 'out on'],
        when: (value) => !['none', undefined].includes(value('heavyLiquid') as string | undefined),
      },
      ...['dyes', 'membranesPeeled', 'retinotomies', 'lensWork', 'sclerotomyClosure'].map(
        (name): Row => ({ fields: [name], when: isNot('vitrectomy', false) }),
      ),
      { fields: ['lensImplant'], when: isNot('lensWork', 'none', undefined) },
    ],
  },
  'vitreous.dyes': { usual: [{ fields: ['kind', 'purpose'], between: ['', 'for'] }] },
  'vitreous.retinotomies': {
    usual: [
      {
        fields: ['kind', 'fromClock', 'toClock', 'treatedBy'],
        between: ['', 'from', 'to', ''],
        unitless: ['fromClock'],
      },
    ],
  },
  'vitreous.lensImplant': {
    usual: [
      {
        fields: ['form', 'powerDioptres', 'position', 'lot', 'expiresOn', 'axialLengthUsedMm'],
        between: ['', '', '', 'lot', 'expiry', 'axial length'],
      },
    ],
  },
  drainage: {
    usual: [
      ...one('kind'),
      { fields: ['internalThrough'], when: is('kind', 'internal', 'both') },
      { fields: ['externalMethod'], when: is('kind', 'external', 'both') },
      { fields: ['clock'], when: isNot('kind', 'none') },
      { fields: ['outcome'], when: isNot('kind', 'none') },
    ],
  },
  retinopexy: { usual: one('treatments') },
  'retinopexy.treatments': {
    usual: [
      ...one('modality', 'targets'),
      { label: 'Extent', fields: ['applications', 'rows'], between: ['spots', 'rows'] },
      {
        fields: ['endpointFirstWhitening'],
        when: isNot('modality', 'endolaser', 'indirect-laser', 'slit-lamp-laser'),
      },
      {
        label: 'Settings',
        fields: ['powerMilliwatts', 'durationMilliseconds'],
        between: ['', ''],
        when: isNot('modality', 'cryo'),
      },
    ],
  },
  tamponade: {
    usual: [
      ...one('agent'),
      { fields: ['mixing'], when: is('agent', ...gases) },
      { label: 'Concentration', fields: ['concentrationPercent'], when: is('agent', ...gases) },
      {
        label: 'Mixed',
        fields: ['pureMl', 'syringeMl'],
        between: ['pure', 'in'],
        when: is('agent', ...gases),
      },
      { fields: ['viscosityCentistokes'], when: is('agent', ...oils) },
      {
        label: 'Volume, fill',
        fields: ['volumeMl', 'fillPercent'],
        between: ['', ''],
        when: isNot('agent', 'none'),
      },
      { fields: ['exchange'], when: isNot('agent', 'none', 'air') },
      {
        label: 'Lot, expiry',
        fields: ['lot', 'expiresOn'],
        between: ['', ''],
        when: isNot('agent', 'none', 'air'),
      },
      { label: 'Iridectomy', fields: ['iridectomy'], when: is('agent', ...oils) },
    ],
    more: [
      { label: 'Paracentesis', fields: ['paracentesis', 'paracentesisVolumeMl'], between: ['', ''] },
      ...one('injectedAtClock'),
    ],
  },
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

/** Lists whose items have many fields: one item is open at a time. The others show all their items in lines. */
export const isPaged = (listPath: string): boolean =>
  ['breaks.found', 'buckle.elements', 'retinopexy.treatments'].includes(listPath);

const named = (rows: readonly Row[]) => rows.flatMap((row) => row.fields.map((name) => name.split('.')[0]));

/** Layout of a group by its path without item numbers. Fields that no row names come last, among the less usual. */
export const layoutOf = (groupPath: string, fields: readonly FieldSpec[]): Required<Layout> => {
  const found = layouts[groupPath.replace(/\.\d+/g, '')];
  if (found === undefined) return { usual: fields.map((field) => ({ fields: [field.name] })), more: [] };
  const more = found.more ?? [];
  const placed = new Set([...named(found.usual), ...named(more)]);
  const rest = fields.filter((field) => !placed.has(field.name)).map((field) => ({ fields: [field.name] }));
  return { usual: found.usual, more: [...more, ...rest] };
};
