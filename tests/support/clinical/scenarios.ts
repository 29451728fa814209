import type { CaseRecord, TamponadeAgent } from '../../../src/domain/record/schema.ts';

export type Lens = NonNullable<NonNullable<CaseRecord['before']>['lens']>;

export type BuckleKind = 'none' | 'band' | 'segment' | 'radial' | 'band-and-segment' | 'band-and-under-band';

export type Disease =
  | 'tears'
  | 'round-holes'
  | 'dialysis'
  | 'giant-tear'
  | 'pvr'
  | 'macular-hole'
  | 'diabetic'
  | 'break-only';

type Weighted<T> = readonly (readonly [number, T])[];

/** One kind of operation, with the patients in whom it is usually done. */
export interface Scenario {
  name: string;
  buckle: BuckleKind;
  temporary?: boolean;
  vitrectomy: boolean;
  disease: Disease;
  agents: Weighted<TamponadeAgent>;
  ages: readonly [number, number];
  lenses: Weighted<Lens>;
  minutes: readonly [number, number];
}

const clear: Weighted<Lens> = [[1, 'phakic']];
const mostlyClear: Weighted<Lens> = [
  [8, 'phakic'],
  [1, 'cataract'],
  [2, 'pseudophakic'],
];
const older: Weighted<Lens> = [
  [4, 'phakic'],
  [3, 'cataract'],
  [6, 'pseudophakic'],
  [0.4, 'aphakic'],
];
const fewGases: Weighted<TamponadeAgent> = [
  [8, 'none'],
  [2, 'air'],
  [1, 'SF6'],
];
const gases: Weighted<TamponadeAgent> = [
  [2, 'air'],
  [9, 'SF6'],
  [3, 'C2F6'],
  [4, 'C3F8'],
];
const oils: Weighted<TamponadeAgent> = [
  [5, 'silicone-oil'],
  [1, 'heavy-oil'],
  [2, 'C3F8'],
];

export const scenarios: Weighted<Scenario> = [
  [
    10,
    {
      name: 'band',
      buckle: 'band',
      vitrectomy: false,
      disease: 'round-holes',
      agents: fewGases,
      ages: [17, 52],
      lenses: mostlyClear,
      minutes: [50, 110],
    },
  ],
  [
    5,
    {
      name: 'temporary band',
      buckle: 'band',
      temporary: true,
      vitrectomy: false,
      disease: 'round-holes',
      agents: fewGases,
      ages: [16, 45],
      lenses: clear,
      minutes: [45, 90],
    },
  ],
  [
    8,
    {
      name: 'segment',
      buckle: 'segment',
      vitrectomy: false,
      disease: 'tears',
      agents: fewGases,
      ages: [20, 65],
      lenses: mostlyClear,
      minutes: [45, 90],
    },
  ],
  [
    5,
    {
      name: 'radial element',
      buckle: 'radial',
      vitrectomy: false,
      disease: 'tears',
      agents: fewGases,
      ages: [18, 62],
      lenses: mostlyClear,
      minutes: [40, 80],
    },
  ],
  [
    4,
    {
      name: 'band and segment',
      buckle: 'band-and-segment',
      vitrectomy: false,
      disease: 'tears',
      agents: fewGases,
      ages: [22, 64],
      lenses: mostlyClear,
      minutes: [70, 120],
    },
  ],
  [
    4,
    {
      name: 'band and implant under it',
      buckle: 'band-and-under-band',
      vitrectomy: false,
      disease: 'tears',
      agents: fewGases,
      ages: [20, 60],
      lenses: mostlyClear,
      minutes: [70, 120],
    },
  ],
  [
    4,
    {
      name: 'dialysis',
      buckle: 'segment',
      vitrectomy: false,
      disease: 'dialysis',
      agents: [
        [9, 'none'],
        [1, 'air'],
      ],
      ages: [10, 40],
      lenses: clear,
      minutes: [45, 95],
    },
  ],
  [
    26,
    {
      name: 'vitrectomy',
      buckle: 'none',
      vitrectomy: true,
      disease: 'tears',
      agents: gases,
      ages: [42, 88],
      lenses: older,
      minutes: [40, 95],
    },
  ],
  [
    3,
    {
      name: 'vitrectomy with oil',
      buckle: 'none',
      vitrectomy: true,
      disease: 'tears',
      agents: [
        [5, 'silicone-oil'],
        [2, 'heavy-oil'],
      ],
      ages: [40, 85],
      lenses: older,
      minutes: [55, 110],
    },
  ],
  [
    10,
    {
      name: 'vitrectomy and band',
      buckle: 'band',
      vitrectomy: true,
      disease: 'tears',
      agents: gases,
      ages: [30, 78],
      lenses: older,
      minutes: [75, 140],
    },
  ],
  [
    7,
    {
      name: 'proliferative vitreoretinopathy',
      buckle: 'none',
      vitrectomy: true,
      disease: 'pvr',
      agents: oils,
      ages: [25, 82],
      lenses: older,
      minutes: [90, 190],
    },
  ],
  [
    3,
    {
      name: 'proliferative vitreoretinopathy with band',
      buckle: 'band',
      vitrectomy: true,
      disease: 'pvr',
      agents: oils,
      ages: [25, 78],
      lenses: older,
      minutes: [100, 200],
    },
  ],
  [
    4,
    {
      name: 'giant tear',
      buckle: 'none',
      vitrectomy: true,
      disease: 'giant-tear',
      agents: [
        [3, 'silicone-oil'],
        [2, 'C3F8'],
        [1, 'SF6'],
      ],
      ages: [18, 70],
      lenses: older,
      minutes: [70, 150],
    },
  ],
  [
    5,
    {
      name: 'pneumatic retinopexy',
      buckle: 'none',
      vitrectomy: false,
      disease: 'tears',
      agents: [
        [5, 'SF6'],
        [3, 'C3F8'],
        [1, 'air'],
      ],
      ages: [40, 75],
      lenses: mostlyClear,
      minutes: [15, 35],
    },
  ],
  [
    2,
    {
      name: 'macular hole detachment',
      buckle: 'none',
      vitrectomy: true,
      disease: 'macular-hole',
      agents: [
        [3, 'silicone-oil'],
        [2, 'C3F8'],
      ],
      ages: [48, 80],
      lenses: older,
      minutes: [60, 120],
    },
  ],
  [
    2,
    {
      name: 'diabetic traction',
      buckle: 'none',
      vitrectomy: true,
      disease: 'diabetic',
      agents: [
        [3, 'silicone-oil'],
        [2, 'C3F8'],
        [1, 'SF6'],
      ],
      ages: [26, 70],
      lenses: older,
      minutes: [80, 170],
    },
  ],
  [
    1,
    {
      name: 'break under haemorrhage',
      buckle: 'none',
      vitrectomy: true,
      disease: 'break-only',
      agents: [
        [3, 'air'],
        [2, 'SF6'],
      ],
      ages: [48, 82],
      lenses: older,
      minutes: [35, 70],
    },
  ],
];
