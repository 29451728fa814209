import {
  among,
  type Claim,
  claim,
  drainageKind,
  hasComplication,
  hasModality,
  hasRole,
  lasers,
  retinotomy,
  some,
} from './claim.ts';

/** What a text can say was done or not done, found or not found. */
export const claims: readonly Claim[] = [
  claim(
    /\b(?:tears?|holes?|breaks?) (?:was|were) (?:left )?untreated\b/g,
    'retinopexy.treatments',
    'retinopexy',
    ({ retinopexy }) => some(retinopexy?.treatments),
    { negative: true },
  ),
  claim(
    /\b(?:external(?:ly)? drain(?:age|ed)|drain(?:ed|age)(?: \w+){0,2} external(?:ly)?|edsrf)\b/g,
    'drainage.kind',
    'external drainage',
    drainageKind(['external', 'both']),
  ),
  claim(
    /\b(?:internal(?:ly)? drain(?:age|ed)|drain(?:ed|age)(?: \w+){0,2} internal(?:ly)?)\b/g,
    'drainage.kind',
    'internal drainage',
    drainageKind(['internal', 'both']),
  ),
  {
    words:
      /\b(?:subretinal fluid (?:was|were) (?:\w+ )?drained|(?:srf|fluid) (?:(?:was|were) )?(?:not )?drain(?:age|ed)|(?<!non-)(?<!non )drainage(?! retinotom| site)(?: of (?:subretinal fluid|srf))?(?= |$|[,.;:])|drained (?:through|via))/g,
    happened: (record) => drainageKind(['external', 'internal', 'both'])(record),
    field: 'drainage.kind',
    recorded: ({ drainage }) =>
      drainage?.kind === 'none' ? 'no drainage' : `${drainage?.kind ?? ''} drainage`,
    unless: /\b(?:difficulty|further|drainage with|without (?:haemorrhage|hemorrhage))\b/,
  },
  claim(
    /\b(?:drainage retinotomy|retinotomy (?:\w+ ){0,2}(?:for|to) drain\w*|drained (?:through|via) (?:a|the) retinotomy)\b/g,
    'drainage.internalThrough',
    'drainage retinotomy',
    ({ drainage }) =>
      drainage?.internalThrough === undefined ? undefined : drainage.internalThrough === 'retinotomy',
  ),
  claim(
    /\b(?:non-?drain(?:age|ing)?|undrained)\b/g,
    'drainage.kind',
    'drainage',
    drainageKind(['external', 'internal', 'both']),
    { negative: true },
  ),
  claim(
    /\b(?:cryo(?:therapy|pexy|retinopexy)?|froze|frozen|freez\w+)\b/g,
    'retinopexy.treatments',
    'cryotherapy',
    (record) => hasModality(record, ['cryo']),
  ),
  claim(
    /\b(?:endo-?laser|laser retinopexy|lasered|indirect laser|laser(?! (?:scars?|only|was enough|in))(?= (?:was|to|applied|round|around|needed)|[.,;]|$))\b/g,
    'retinopexy.treatments',
    'laser',
    (record) => hasModality(record, lasers),
    { unless: /\b(?:more laser|lattice|assistants?|who (?:indented|assisted|held))\b/ },
  ),
  claim(/\bretinopexy\b(?<!pneumatic retinopexy)/g, 'retinopexy.treatments', 'retinopexy', ({ retinopexy }) =>
    some(retinopexy?.treatments),
  ),
  claim(
    /\b(?:encircling (?:band|element|buckle)|encirclement|360(?:°| degrees?)? (?:band|buckle)|eb|(?<!the |this |under |wrist)band(?=\s+(?:was|were|used|added)|[.,;]|$))\b/g,
    'buckle.elements',
    'encircling band',
    (record) => hasRole(record, 'encircling'),
  ),
  claim(
    /\b(?:scleral buckle|buckling(?! element)|(?<!the |on )buckle(?= (?:was|used)))\b/g,
    'buckle.elements',
    'buckle',
    ({ buckle }) => some(buckle?.elements),
  ),
  claim(/\b(?:complications?)\b/g, 'endOfCase.complications', 'complications', ({ endOfCase }) =>
    some(endOfCase?.complications),
  ),
  claim(
    /\b(?:uncomplicated|uneventful(?:ly)?)\b/g,
    'endOfCase.complications',
    'complications',
    ({ endOfCase }) => some(endOfCase?.complications),
    { negative: true },
  ),
  claim(
    /\biatrogenic (?:break|tear|hole)s?\b/g,
    'endOfCase.complications',
    'iatrogenic break',
    hasComplication('iatrogenic-break'),
  ),
  claim(/\blens touch\b/g, 'endOfCase.complications', 'lens touch', hasComplication('lens-touch')),
  claim(
    /\bchoroidal ha?emorrhage\b/g,
    'endOfCase.complications',
    'choroidal haemorrhage',
    hasComplication('choroidal-haemorrhage'),
  ),
  claim(
    /\bsubretinal ha?emorrhage\b/g,
    'endOfCase.complications',
    'subretinal haemorrhage',
    hasComplication('subretinal-haemorrhage'),
  ),
  claim(
    /\bretinal incarceration\b/g,
    'endOfCase.complications',
    'retinal incarceration',
    hasComplication('retinal-incarceration'),
  ),
  claim(
    /\bscleral perforation\b/g,
    'endOfCase.complications',
    'scleral perforation',
    hasComplication('scleral-perforation'),
  ),
  claim(
    /\b(?:vitrectomy|ppv)\b/g,
    'vitreous.vitrectomy',
    'vitrectomy',
    ({ vitreous }) => vitreous?.vitrectomy,
  ),
  claim(
    /\bnitrous oxide (?:was (?:used|given)|anaesthesia)\b/g,
    'anaesthesia.nitrousOxideUsed',
    'nitrous oxide',
    ({ anaesthesia }) => anaesthesia?.nitrousOxideUsed,
  ),
  claim(
    /\b(?:general ana?esth(?:etic|esia)|(?<=under )ga)\b/g,
    'anaesthesia.kind',
    'general anaesthesia',
    ({ anaesthesia }) => (anaesthesia?.kind === undefined ? undefined : anaesthesia.kind === 'general'),
  ),
  claim(
    /\b(?:specimens?)\b(?= (?:was|were|sent|taken)|$|[,.;:])/g,
    'endOfCase.specimens',
    'specimens',
    ({ endOfCase }) => some(endOfCase?.specimens),
  ),
  claim(/\b(?:proliferative vitreoretinopathy|pvr)\b/g, 'before.pvr.grade', 'PVR', ({ before }) =>
    before?.pvr?.grade === undefined ? undefined : before.pvr.grade !== 'none',
  ),
  claim(
    /\b(?:primary)(?= (?:retinal |rhegmatogenous )?(?:detachment|rr?d)\b)/g,
    'before.recurrent',
    'recurrence',
    ({ before }) => before?.recurrent,
    { negative: true },
  ),
  claim(
    /\b(?:recurrent|re-?detachment)\b/g,
    'before.recurrent',
    'recurrence',
    ({ before }) => before?.recurrent,
  ),
  claim(
    /\bvitreous ha?emorrhage\b/g,
    'before.vitreousHaemorrhage',
    'vitreous haemorrhage',
    ({ before }) => before?.vitreousHaemorrhage,
  ),
  claim(
    /\b(?:pvd|posterior vitreous detachment)\b(?! (?:was )?induc| only)/g,
    'before.posteriorVitreousDetachment',
    'posterior vitreous detachment',
    ({ before }) => {
      const pvd = before?.posteriorVitreousDetachment;
      return pvd === undefined || pvd === 'unknown' || pvd === 'partial' ? undefined : pvd !== 'none';
    },
    { unless: /\binduc/ },
  ),
  claim(
    /\b(?:(?:pvd|posterior vitreous detachment) (?:was |is )?(?:already )?complete|hyaloid (?:was |is )?already detached)\b/g,
    'before.posteriorVitreousDetachment',
    'complete posterior vitreous detachment',
    ({ before, vitreous }) => {
      const pvd = before?.posteriorVitreousDetachment;
      if (vitreous?.hyaloid === 'induced') return false;
      return pvd === undefined || pvd === 'unknown' ? undefined : pvd === 'complete';
    },
  ),
  claim(
    /\b(?:pvd|posterior vitreous detachment|hyaloid detachment) (?:was )?induced|\binduction of (?:a )?(?:pvd|posterior vitreous detachment)|\bhyaloid (?:was )?(?:attached|induced)\b/g,
    'vitreous.hyaloid',
    'induced vitreous detachment',
    ({ vitreous }) =>
      vitreous?.hyaloid === undefined
        ? vitreous?.vitrectomy === false
          ? false
          : undefined
        : vitreous.hyaloid === 'induced',
  ),
  claim(
    /\b(?:ilm|internal limiting membrane)\b(?: (?:was |is )?(?:peeled|peel)|peeling)?/g,
    'vitreous.membranesPeeled',
    'ILM peel',
    ({ vitreous }) => among(vitreous?.membranesPeeled, 'ilm'),
  ),
  claim(
    /\b(?:membranes?|erm) (?:was |were )?(?:not )?peeled\b|\bmembrane peel\w*|(?<!ilm )\bpeel(?:ing)?\b/g,
    'vitreous.membranesPeeled',
    'membrane peel',
    ({ vitreous }) =>
      vitreous?.membranesPeeled === undefined
        ? undefined
        : vitreous.membranesPeeled.some((one) => one !== 'none'),
  ),
  claim(
    /\b(?:heavy liquid|pfcl|perfluorocarbon(?: liquid)?)\b(?! (?:was |is )?(?:left|remov|taken|not removed|in the))/g,
    'vitreous.heavyLiquid',
    'heavy liquid',
    ({ vitreous }) => (vitreous?.heavyLiquid === undefined ? undefined : vitreous.heavyLiquid !== 'none'),
    { unless: /\bleft behind\b/ },
  ),
  claim(
    /\b(?:heavy liquid|pfcl) (?:was |is )?left\b(?! in for)/g,
    'vitreous.heavyLiquid',
    'heavy liquid left',
    ({ vitreous }) =>
      vitreous?.heavyLiquid === undefined
        ? undefined
        : ['left', 'not-removed'].includes(vitreous.heavyLiquid),
  ),
  claim(
    /\b(?<!retinotomy or )(?:relaxing )?retinectomy\b(?! edge)/g,
    'vitreous.retinotomies',
    'retinectomy',
    retinotomy(['retinectomy', 'relaxing']),
  ),
  claim(
    /\bretinotomy\b(?! or)/g,
    'vitreous.retinotomies',
    'retinotomy',
    retinotomy(['retinectomy', 'relaxing', 'drainage']),
  ),
  claim(/\b(?:iridectomy|inferior pi|pi)\b/g, 'tamponade.iridectomy', 'iridectomy', ({ tamponade }) =>
    tamponade?.iridectomy === undefined ? undefined : tamponade.iridectomy !== 'none',
  ),
  claim(
    /\b(?:(?:ac )?paracentesis|ac tap)\b/g,
    'tamponade.paracentesis',
    'paracentesis',
    ({ tamponade }) => tamponade?.paracentesis,
    { unless: /attempts/ },
  ),
  claim(
    /\b(?:sclerotom\w+|ports?) (?:was |were )?(?:all )?sutured\b/g,
    'vitreous.sclerotomyClosure',
    'suture of the sclerotomies',
    ({ vitreous }) =>
      vitreous?.sclerotomyClosure === undefined || vitreous.sclerotomyClosure === 'not-applicable'
        ? undefined
        : vitreous.sclerotomyClosure !== 'sutureless',
  ),
  claim(
    /\b(?:sutureless|no sutures to (?:the )?(?:ports|sclerotomies))\b/g,
    'vitreous.sclerotomyClosure',
    'suture of the sclerotomies',
    ({ vitreous }) =>
      vitreous?.sclerotomyClosure === undefined || vitreous.sclerotomyClosure === 'not-applicable'
        ? undefined
        : vitreous.sclerotomyClosure !== 'sutureless',
    { negative: true },
  ),
  claim(
    /\b360(?:°| degrees?)? ?peritomy|full(?: circle)? peritomy\b/g,
    'buckle.peritomy',
    '360° peritomy',
    ({ buckle }) => (buckle?.peritomy === undefined ? undefined : buckle.peritomy === 'full-circle'),
  ),
  claim(
    /\b(?:subretinal fluid|srf|fluid) (?:was |is |has been )?(?:left(?! undrained| alone)|remain\w*|persist\w*)\b|\bresidual (?:srf|subretinal fluid)\b/g,
    'endOfCase.retina',
    'fluid left',
    ({ endOfCase }) => (endOfCase?.retina === undefined ? undefined : endOfCase.retina !== 'flat'),
    { unless: /\buntil\b|\bno residual fluid\b/ },
  ),
  claim(
    /\bretina (?:was |is )?(?:now |not )?(?:completely |fully |totally |entirely )?flat\b(?= at the end|$|[.,;])/g,
    'endOfCase.retina',
    'flat retina',
    ({ endOfCase }) => (endOfCase?.retina === undefined ? undefined : endOfCase.retina === 'flat'),
  ),
  claim(/\b(?:lens (?:was )?(?:not )?removed)\b/g, 'vitreous.lensWork', 'lens removal', ({ vitreous }) =>
    vitreous?.lensWork === undefined
      ? undefined
      : ['phacoemulsification', 'lensectomy'].includes(vitreous.lensWork),
  ),
];
