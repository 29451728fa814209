import type { Procedure } from '../record/procedures.ts';
import type { CaseRecord } from '../record/schema.ts';
import { elementsOf, gasOf, oilOf, retinotomiesOf, treatmentsOf } from './facts.ts';

/** What the stages say of a procedure: done, not done, or `undefined` while they leave it open. */
interface Recorded {
  procedure: Procedure;
  done: boolean | undefined;
  field: string;
  /** Done as a part of something larger it need not stand in the list. */
  listedOnly?: boolean;
}

const buckles = (record: CaseRecord): Recorded[] => {
  const elements = record.buckle?.elements;
  const roles = elementsOf(record).map(({ role }) => role);
  const known = elements === 'none' || (elements !== undefined && !roles.includes(undefined));
  const segment = roles.includes('segment');
  const local = roles.some((role) => role === 'meridional' || role === 'under-band');
  return [
    {
      procedure: 'encircling-band',
      done: known ? roles.includes('encircling') : undefined,
      field: 'buckle.elements',
    },
    {
      procedure: 'segmental-buckle',
      done: known ? segment || local : undefined,
      field: 'buckle.elements',
      // A local element may be a part of the band.
      listedOnly: roles.includes('encircling'),
    },
  ];
};

const insideTheEye = (record: CaseRecord): Recorded[] => {
  const { vitreous } = record;
  const peeled = vitreous?.membranesPeeled;
  const work = vitreous?.lensWork;
  const cuts = vitreous?.retinotomies;
  const kinds = retinotomiesOf(record).map(({ kind }) => kind);
  const large = kinds.some((kind) => kind === 'relaxing' || kind === 'retinectomy');
  const implant = vitreous?.lensImplant;
  return [
    { procedure: 'vitrectomy', done: vitreous?.vitrectomy, field: 'vitreous.vitrectomy' },
    {
      procedure: 'membrane-peel',
      done: peeled?.some((one) => one !== 'none'),
      field: 'vitreous.membranesPeeled',
      listedOnly: peeled?.some((one) => one === 'preretinal' || one === 'subretinal') !== true,
    },
    {
      procedure: 'retinotomy',
      done: cuts === undefined || kinds.includes(undefined) ? undefined : kinds.length > 0,
      field: 'vitreous.retinotomies',
      listedOnly: !large,
    },
    {
      procedure: 'lens-removal',
      // An implant that was taken out may be listed or not.
      done: work === undefined || work === 'implant-removed' ? undefined : work !== 'none',
      field: 'vitreous.lensWork',
    },
    {
      procedure: 'lens-implant',
      done: implant === undefined ? undefined : implant !== 'not-applicable',
      field: 'vitreous.lensImplant',
    },
  ];
};

const retinopexyAndDrainage = (record: CaseRecord): Recorded[] => {
  const treatments = record.retinopexy?.treatments;
  const modalities = treatmentsOf(record).map(({ modality }) => modality);
  const known = treatments === 'none' || (treatments !== undefined && !modalities.includes(undefined));
  const drainage = record.drainage?.kind;
  return [
    {
      procedure: 'external-drainage',
      done: drainage === undefined ? undefined : drainage === 'external' || drainage === 'both',
      field: 'drainage.kind',
    },
    {
      procedure: 'cryotherapy',
      done: known ? modalities.includes('cryo') : undefined,
      field: 'retinopexy.treatments',
    },
    {
      procedure: 'laser',
      done: known ? modalities.some((one) => one?.includes('laser') === true) : undefined,
      field: 'retinopexy.treatments',
    },
  ];
};

const tamponades = (record: CaseRecord): Recorded[] => {
  const agent = record.tamponade?.agent;
  const gas = gasOf(record) !== undefined;
  const pneumatic = record.who?.performed?.includes('pneumatic-retinopexy') === true;
  return [
    {
      procedure: 'gas',
      done: agent === undefined ? undefined : gas,
      field: 'tamponade.agent',
      // Air is often not called a gas tamponade, and the gas of a pneumatic retinopexy is in its name.
      listedOnly: agent === 'air' || pneumatic,
    },
    {
      procedure: 'oil',
      done: agent === undefined ? undefined : oilOf(record) !== undefined,
      field: 'tamponade.agent',
    },
    {
      procedure: 'pneumatic-retinopexy',
      done: agent === undefined ? undefined : gas,
      field: 'tamponade.agent',
      listedOnly: true,
    },
  ];
};

/** What the stages record of each procedure of the list. */
export const recordedProcedures = (record: CaseRecord): Recorded[] => [
  ...insideTheEye(record),
  ...buckles(record),
  ...tamponades(record),
  ...retinopexyAndDrainage(record),
];
