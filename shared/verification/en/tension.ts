import { lengthsOfGroup } from '../../engine/limit-states/t-stub.ts';
import {
  boltsWithFlange,
  boltTensionResistance,
  plasticMoment,
  pryingLever,
  tyingFactor,
} from '../../engine/standards/en-1993-1-8-2005/index.ts';
import { bolt, en, grades } from '../bases.ts';
import { type Check, printed, rounding } from '../check.ts';

const cleats = {
  basis: 'en-1993-1-8-2005',
  evidence: 'found in text',
  source:
    'Steel Buildings in Europe, Multi-Storey Steel Buildings Part 5: Joint Design, 4.4 angle web cleats, p. 5-78, 5-79',
} as const;
const two = 'two cleats 90 × 90 × 10 S275 (430); 6 × 2 M20 8.8, p_1 70, e_1 40; γ_Mu 1.1';
const moment = () => plasticMoment(lengthsOfGroup(31.2, 40, 40, 70, 6).other, 10, 430 / tyingFactor);
const ultimateBolt = () => boltTensionResistance({ fub: 800, As: bolt(20).stressArea, gammaM2: tyingFactor });
const roundedBolt = rounding('F_t,Rd,u', 160, 160.3636);

const tying: readonly Check[] = [
  {
    ...cleats,
    id: 'CLT-11-length',
    clause: 'Table 6.4',
    inputs: `${two}: effective length of all rows`,
    published: printed('430'),
    unit: 'mm',
    ours: () => lengthsOfGroup(31.2, 40, 40, 70, 6).other,
    weak: 'the print comes to the length by limits of its own, not by Table 6.4',
  },
  {
    ...cleats,
    id: 'CLT-11',
    clause: 'Table 6.2',
    inputs: `${two}: plastic moment with f_u/γ_Mu`,
    published: printed('4.2'),
    unit: 'kN·m',
    ours: () => moment() / 1e6,
  },
  {
    ...cleats,
    id: 'CLT-11-n',
    clause: 'Table 6.2',
    inputs: 'm 31.2, e 40',
    published: printed('39'),
    unit: 'mm',
    ours: () => pryingLever(31.2, 40),
  },
  {
    ...cleats,
    id: 'CLT-11-bolt',
    clause: 'Table 3.4',
    inputs: 'M20 8.8 in tension with γ_Mu 1.1',
    published: printed('160'),
    unit: 'kN',
    ours: () => ultimateBolt() / 1000,
  },
  {
    ...cleats,
    id: 'CLT-11-mode-2',
    clause: 'Table 6.2',
    inputs: `${two}; m as printed, 31; n 39`,
    published: printed('1190'),
    unit: 'kN',
    ours: () => boltsWithFlange(moment(), 31, 39, 12 * ultimateBolt()) / 1000,
    roundedFirst: roundedBolt,
  },
  {
    ...cleats,
    id: 'CLT-11-mode-3',
    clause: 'Table 6.2',
    inputs: `${two}: the bolts alone`,
    published: printed('1920'),
    unit: 'kN',
    ours: () => (12 * ultimateBolt()) / 1000,
    roundedFirst: roundedBolt,
  },
];

/** Web beside a partial depth end plate, A_v = 0.9 h_p t_w. */
const webs: readonly Check[] = (
  [
    ['PDE-04', 'UKB 406x178x74, t_w 9.5, h_p 290', 290 * 9.5, '394'],
    ['PDE-05', 'UKB 533x210x92, t_w 10.1, h_p 430', 430 * 10.1, '621'],
  ] as const
).map(([id, inputs, area, text]) => ({
  id,
  basis: 'en-1993-1-8-2005',
  clause: 'EN 1993-1-1 6.2.6',
  source: 'SCI P358, Table G.4, quoted in a design example of December 2013',
  evidence: 'found in text',
  inputs: `${inputs}, S275: the web in shear over 0.9 h_p`,
  published: printed(text),
  unit: 'kN',
  ours: () => en.shearYield(0.9 * area, 275, null) / 1000,
}));

const given = { size: bolt(20), grade: grades['8.8'], headDiameter: 31.5, plateFu: 410 };
const evaluated = (id: string, clause: string, inputs: string, text: string, ours: () => number): Check => ({
  id: `ER-${id}`,
  basis: 'en-1993-1-8-2005',
  clause,
  source: 'formula of the clause, worked by hand',
  evidence: 'rule evaluation',
  inputs,
  published: printed(text),
  unit: 'kN',
  ours: () => ours() / 1000,
});

const rules: readonly Check[] = [
  evaluated('tension-bolt', 'Table 3.4', '0.9 × 800 × 245/1.25, below punching of t 10', '141.1', () =>
    en.boltTension({ ...given, plateThickness: 10 }, null),
  ),
  evaluated('tension-punching', 'Table 3.4', '0.6 π 31.5 × 6 × 410/1.25, below the bolt', '116.9', () =>
    en.boltTension({ ...given, plateThickness: 6 }, null),
  ),
  evaluated('shear-tension', 'Table 3.4', '1.4 (1 − 0.5) × 141.12, half of the shear used', '98.8', () =>
    en.tensionWithShear(141_120, 0.5, null),
  ),
  evaluated('shear-tension-none', 'Table 3.4', '1.4 (1 − 0.25) is above 1: the whole tension', '141.1', () =>
    en.tensionWithShear(141_120, 0.25, null),
  ),
  evaluated('plate-shear-net', 'EN 1993-1-1 6.2.6', '10 (300 − 4 × 22) × 430/(√3 × 1.25)', '421.05', () =>
    en.shearRupture(10 * (300 - 4 * 22), 430, null),
  ),
];

export const enTension: readonly Check[] = [...tying, ...webs, ...rules];
