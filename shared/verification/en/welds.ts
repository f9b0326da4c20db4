import {
  columnCurveC,
  correlationFactor,
  filletDirectional,
  filletSimplified,
} from '../../engine/standards/en-1993-1-8-2005/index.ts';
import { type Check, printed } from '../check.ts';

const gammaM2 = 1.25;

/** Throat over plate thickness at which two fillets across the force are as strong as the plate. */
const fullStrength: readonly Check[] = (
  [
    ['S235', 235, 360, '0.46', undefined],
    ['S275', 275, 430, '0.48', undefined],
    ['S355', 355, 510, '0.55', undefined],
    ['S460', 460, 550, '0.74', 'fu 550 is the value that fits the print'],
  ] as const
).map(([name, fy, fu, text, weak]) => ({
  id: `full-strength-fillet-${name}`,
  basis: 'en-1993-1-8-2005',
  clause: '4.5.3.2',
  source: 'Steel Buildings in Europe, Multi-Storey Steel Buildings Part 5: Joint Design, 2.2.6, p. 5-11',
  evidence: 'found in text',
  inputs: `${name}: fy ${fy}, fu ${fu}; two fillets across the force`,
  published: printed(text),
  unit: 'a/t',
  // The utilisation of a throat of 1 mm beside a plate of 1 mm at yield is the throat that is needed.
  ours: () => {
    const across = fy / 2 / Math.SQRT2;
    return filletDirectional(across, across, 0, fu, correlationFactor(fy, fu), gammaM2);
  },
  ...(weak === undefined ? {} : { weak }),
}));

/** Leg, printed strength along and across the force, kN/mm; the throat is 0.7 of the leg as the table has it. */
type Row = readonly [leg: number, along: string, across: string];
const s275: readonly Row[] = [
  [3, '0.468', '0.573'],
  [4, '0.624', '0.764'],
  [5, '0.780', '0.955'],
  [6, '0.936', '1.15'],
  [8, '1.25', '1.53'],
  [10, '1.56', '1.91'],
  [12, '1.87', '2.29'],
  [15, '2.34', '2.87'],
];
const s355: readonly Row[] = [
  [3, '0.507', '0.620'],
  [4, '0.675', '0.827'],
  [5, '0.844', '1.03'],
  [6, '1.01', '1.24'],
  [8, '1.35', '1.65'],
  [10, '1.69', '2.07'],
  [12, '2.03', '2.48'],
  [15, '2.53', '3.10'],
];

function unitStrengths(steel: string, fy: number, fu: number, rows: readonly Row[]): Check[] {
  const betaW = correlationFactor(fy, fu);
  return rows.flatMap(([leg, along, across]) => {
    const throat = 0.7 * leg;
    const common = {
      basis: 'en-1993-1-8-2005',
      source: 'SCI P363, fillet welds',
      evidence: 'from memory',
      inputs: `${steel}, fu ${fu}, leg ${leg}, throat ${throat.toFixed(1)}`,
      unit: 'kN/mm',
    } as const;
    const stress = 1 / (throat * Math.SQRT2);
    return [
      {
        ...common,
        id: `fillet-${steel}-${leg}-along`,
        clause: '4.5.3.3',
        published: printed(along),
        ours: () => (filletSimplified(fu, betaW, gammaM2) * throat) / 1000,
      },
      {
        ...common,
        id: `fillet-${steel}-${leg}-across`,
        clause: '4.5.3.2',
        published: printed(across),
        ours: () => 1 / filletDirectional(stress, stress, 0, fu, betaW, gammaM2) / 1000,
      },
    ];
  });
}

const truss = {
  basis: 'en-1993-1-8-2005',
  clause: '4.5.3.2',
  source: 'Steel Buildings in Europe, Single-Storey Steel Buildings Part 5, Appendix B, p. 5-86',
  evidence: 'found in text',
  unit: 'mm of throat',
} as const;
const required: readonly Check[] = [
  {
    ...truss,
    id: 'TRS-17',
    inputs: 'σ⊥ a = τ⊥ a = 122.08, τ∥ a = 581.44 N/mm; fu 510, βw 0.8 as printed',
    published: printed('2.03'),
    ours: () => filletDirectional(122.08, 122.08, 581.44, 510, 0.8, gammaM2),
    note: 'For S355 Table 4.1 has βw 0.9: see the disagreements.',
  },
  {
    ...truss,
    id: 'TRS-18',
    inputs: 'second condition alone: σ⊥ a = 122.08 N/mm, fu 510',
    published: printed('0.33'),
    ours: () => filletDirectional(122.08, 0, 0, 510, 0.8, gammaM2),
  },
];

/** Buckling curve c of EN 1993-1-1, which the gusset in compression takes. */
const curveC: readonly Check[] = (
  [
    [0.3, '0.9491'],
    [0.5, '0.8430'],
    [0.8, '0.6622'],
    [1.0, '0.5399'],
    [1.4, '0.3492'],
    [2.0, '0.1962'],
  ] as const
).map(([slenderness, text]) => ({
  id: `curve-c-${slenderness.toFixed(1)}`,
  basis: 'en-1993-1-8-2005',
  clause: 'EN 1993-1-1 6.3.1.2',
  source: 'tabulated reduction factors of the European buckling curves',
  evidence: 'from memory',
  inputs: `curve c, slenderness ${slenderness}`,
  published: printed(text),
  unit: 'χ',
  ours: () => columnCurveC(slenderness),
}));

export const enWelds: readonly Check[] = [
  ...fullStrength,
  ...unitStrengths('S275', 275, 410, s275),
  ...unitStrengths('S355', 355, 470, s355),
  ...required,
  ...curveC,
];
