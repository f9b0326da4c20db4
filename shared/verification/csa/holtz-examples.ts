import * as csa from '../../engine/standards/csa-s16-2019/index.ts';
import {
  type Check,
  type Disagreement,
  printed,
  type RoundedFirst,
  rounding,
  threeFigures,
} from '../check.ts';

const NOTES =
  'Course notes CIVE 3205, Carleton University (N. Holtz), to CSA S16-14 and the CISC Handbook, 11th ed.';

/** Adds a row to an example: state, clause, inputs, printed value, unit, ours. */
type Add = (
  state: string,
  clause: string,
  inputs: string,
  value: string,
  unit: string,
  ours: () => number,
  extra?: { readonly threeFigures?: boolean; readonly roundedFirst?: RoundedFirst },
) => void;

/** The rows of one example of the notes; ids count up under its name. */
function example(name: string, fill: (r: Add) => void): Check[] {
  const rows: Check[] = [];
  fill((state, clause, inputs, value, unit, ours, extra = {}) => {
    rows.push({
      id: `csa-${name.toLowerCase()}-${rows.length + 1}`,
      basis: 'csa-s16-2019',
      clause: `CSA S16 ${clause}`,
      source: `${NOTES}, example ${name}`,
      evidence: 'found in text',
      inputs: `${state}: ${inputs}`,
      published: extra.threeFigures === true ? threeFigures(Number(value)) : printed(value),
      unit,
      ours,
      ...(extra.roundedFirst === undefined ? {} : { roundedFirst: extra.roundedFirst }),
    });
  });
  return rows;
}

const shank = (d: number) => (Math.PI * d * d) / 4;
const kN = (newtons: number) => newtons / 1000;
const intercepted = { threadsIntercepted: true, L: 0 };
const block = (Ut: number, An: number, Agv: number, Fy: number, Fu: number) => () =>
  kN(csa.blockResistance(Ut, An, Agv, Fy, Fu));
const metal = (D: number, degrees: number, Mw: number, length: number) => () =>
  kN(length * csa.filletWeldMetal({ D, Xu: 490, theta: (degrees * Math.PI) / 180, Mw }));

const c10 = example('C10', (r) => {
  const plates = '2 PL10x140 350W lapped, 6 M20 A325M (2x3), punched';
  r('bolt shear', '13.12.1.2(c)', `${plates}, threads intercepted`, '526', 'kN', () =>
    kN(csa.boltShearResistance({ m: 6, Ab: shank(20), Fu: 830, ...intercepted })),
  );
  r('bearing', '13.12.1.2(a)', plates, '1296', 'kN', () => kN(6 * csa.bearingResistance(10, 20, 450)));
  r('gross yield', '13.2(a)(i)', plates, '441', 'kN', () => kN(csa.grossYield(10 * 140, 350)));
  r('net fracture', '13.2(a)(iii)', `${plates}, A_n = 10 (140 − 2 × 24)`, '310', 'kN', () =>
    kN(csa.netSectionResistance(10 * (140 - 2 * 24), 450)),
  );
  r('block, U_t 1.0', '13.11', 'A_n 360, A_gv 3600', '770', 'kN', block(1, 360, 3600, 350, 450));
  r('block, U_t 0.9', '13.11', 'A_n 560, A_gv 3600', '818', 'kN', block(0.9, 560, 3600, 350, 450));
  r('block, U_t 0.6', '13.11', 'A_n 640, A_gv 1800', '454', 'kN', block(0.6, 640, 1800, 350, 450));
  r('tear-out', '13.11', '2 lines, 180 mm, t 10', '1296', 'kN', block(0, 0, 4 * 180 * 10, 350, 450));
  r('least pitch', '22.3.1', 'M20', '54', 'mm', () => csa.detailing.leastPitch(20, 22));
  r('least edge, sheared', 'Table 6', 'M20', '34', 'mm', () => csa.leastEdgeDistance(20, 'sheared'));
  r('greatest edge', '22.3.3', 't 10', '120', 'mm', () => csa.detailing.greatestEdge(10, true));
});

const c30 = example('C30', (r) => {
  r('bearing, one bolt', '13.12.1.2(a)', 'web 6.4, M20, F_u 450', '138', 'kN', () =>
    kN(csa.bearingResistance(6.4, 20, 450)),
  );
  r(
    'bolt shear',
    '13.12.1.2(c)',
    '1 M20 A325M, threads intercepted',
    '87.5',
    'kN',
    () => kN(csa.boltShearResistance({ m: 1, Ab: shank(20), Fu: 830, ...intercepted })),
    { roundedFirst: rounding('V_r with the threads clear', 125, 125.16) },
  );
  r('tear-out of the angle', '13.11', 'A_gv 1715', '309', 'kN', block(0, 0, 1715, 350, 450));
  r('block of the angle, U_t 0.6', '13.11', 'A_n 238, A_gv 858', '203', 'kN', block(0.6, 238, 858, 350, 450));
  r('tear-out of the web', '13.11', 'A_gv 1152', '207', 'kN', block(0, 0, 1152, 350, 450));
  r('block of the coped web, U_t 0.9', '13.11', 'A_n 307, A_gv 576', '197', 'kN', () =>
    kN(csa.blockResistance(csa.tensionEfficiency['coped-one-line'], 307, 576, 350, 450)),
  );
});

const c40 = example('C40', (r) => {
  const mw = (a: number, b: number) => () => csa.multiOrientationFactor(a, b);
  const inclined = csa.multiOrientationFactor(18.4, 90);

  r('M_w', '13.13.2.2', '18.4° beside 90°', '0.881', '', mw(18.4, 90));
  r('fillet inclined', '13.13.2.2', '253 mm at 18.4°', '226', 'kN', metal(6, 18.4, inclined, 253));
  r('fillet along', '13.13.2.2', '200 mm at 0°, M_w 0.85', '159', 'kN', metal(6, 0, mw(0, 90)(), 200));
  r(
    'joint of three directions',
    '13.13.2.2',
    'sum of the three',
    '496',
    'kN',
    () => metal(6, 90, 1, 80)() + metal(6, 18.4, inclined, 253)() + metal(6, 0, 0.85, 200)(),
    { roundedFirst: { what: 'the part at 90° printed as 111, cut off from 111.98', share: 0.98 / 496 } },
  );
  r('fillet inclined alone', '13.13.2.2', '253 mm at 18.4°, M_w 1', '257', 'kN', metal(6, 18.4, 1, 253));
  r('M_w', '13.13.2.2', '0° beside 18.4°', '0.965', '', mw(0, 18.4));
  r('fillet along, per mm', '13.13.2.2', '6 mm, M_w 0.965', '0.900', 'kN/mm', metal(6, 0, mw(0, 18.4)(), 1), {
    roundedFirst: rounding('v and M_w', 0.933 * 0.965, 0.93322 * 0.96518),
  });
});

const c50 = example('C50', (r) => {
  const shear = () => kN(csa.boltShearResistance({ m: 4, Ab: shank(22), Fu: 830, ...intercepted }));
  const tension = () => kN(4 * csa.boltTensionResistance({ Ab: shank(22), Fu: 830 }));
  r('bolt shear', '13.12.1.2(c)', '4 M22 A325M, threads intercepted', '424', 'kN', shear);
  r('bolt tension', '13.12.1.3', '4 M22 A325M', '757', 'kN', tension);
  r('shear with tension', '13.12.1.4', 'load at 40° to the plane of shear', '501', 'kN', () => {
    const angle = (40 * Math.PI) / 180;
    const V = Math.cos(angle);
    const T = Math.sin(angle);
    return 1 / csa.shearTensionUtilisation({ V, T, Vr: shear(), Tr: tension() });
  });
});

const cps = [
  ...example('CPS1', (r) => {
    const hss = 'HSS 219x13, A 8230, F_y 300';
    r('gross yield', '13.2(a)(i)', hss, '2220', 'kN', () => kN(csa.grossYield(8230, 300)), {
      threeFigures: true,
    });
    r('fillet across', '13.13.2.2', '8 mm, E49XX, 688 mm all round', '1290', 'kN', metal(8, 90, 1, 688), {
      threeFigures: true,
      roundedFirst: rounding('strength per mm', 1.87, 1.8664),
    });
    r('bolt tension', '13.12.1.3', '4 M20 A325M', '625.8', 'kN', () =>
      kN(4 * csa.boltTensionResistance({ Ab: shank(20), Fu: 830 })),
    );
  }),
  ...example('CPS2', (r) => {
    const angle = 'L203x102x13, A 3710, t 12.7, F_y 300, F_u 450, 2 lines of M20';
    r('gross yield', '13.2(a)(i)', angle, '1002', 'kN', () => kN(csa.grossYield(3710, 300)));
    r('net fracture, one leg', '12.3.3.2', `${angle}, 3 rows`, '628', 'kN', () =>
      kN(csa.netSectionResistance(csa.oneLegFactor(3) * (3710 - 2 * 24 * 12.7), 450)),
    );
    r(
      'block of the angle',
      '13.11',
      'U_t 0.6, A_n 711, A_gv 5080',
      '1001',
      'kN',
      block(0.6, 711, 5080, 300, 450),
    );
    r(
      'block of the angle',
      '13.11',
      'U_t 0.6, A_n 1105, A_gv 2540',
      '652.4',
      'kN',
      block(0.6, 1105, 2540, 300, 450),
    );
    r(
      'block of the gusset',
      '13.11',
      'U_t 1, A_n 1680, A_gv 10800',
      '2390',
      'kN',
      block(1, 1680, 10800, 300, 450),
    );
    r('bearing', '13.12.1.2(a)', '6 M20, t 25.4', '3292', 'kN', () =>
      kN(6 * csa.bearingResistance(25.4, 20, 450)),
    );
    r('bolt shear', '13.12.1.2(c)', '6 M20 A325M, double shear', '1051', 'kN', () =>
      kN(csa.boltShearResistance({ m: 12, Ab: shank(20), Fu: 830, ...intercepted })),
    );
  }),
  ...example('CPS4', (r) => {
    const angle = 'L152x89x16, A 3580';
    r('fillet across', '13.13.2.2', '8 mm, 152 mm', '283.7', 'kN', metal(8, 90, 1, 152));
    r(
      'fillet along',
      '13.13.2.2',
      '8 mm, 150 mm',
      '158.6',
      'kN',
      metal(8, 0, csa.multiOrientationFactor(0, 90), 150),
    );
    r(
      'joint',
      '13.13.2.2',
      'sum of both',
      '442',
      'kN',
      () => metal(8, 90, 1, 152)() + metal(8, 0, 0.85, 150)(),
    );
    r('fracture', '13.2(a)(iii)', 'A_ne 3062', '1033', 'kN', () => kN(csa.netSectionResistance(3062, 450)));
    r('gross yield', '13.2(a)(i)', angle, '967', 'kN', () => kN(csa.grossYield(3580, 300)));
  }),
];

const t04 = example('T-4', (r) => {
  const width = csa.sideWeldedWidth(180, 100);
  r('effective net area', '12.3.3.3', '2 PL12x100, side welds 180', '2280', 'mm²', () => 2 * 12 * width);
  r('fracture', '13.2(a)(iii)', 'A_ne 2280, F_u 480', '821', 'kN', () =>
    kN(csa.netSectionResistance(2 * 12 * width, 480)),
  );
  r('fracture', '13.2(a)(iii)', 'A_ne 2309, F_u 480', '831', 'kN', () =>
    kN(csa.netSectionResistance(2309, 480)),
  );
  r('gross yield', '13.2(a)(i)', '2 PL12x100 350A', '756', 'kN', () => kN(csa.grossYield(2400, 350)));
});

const t07 = example('T-7', (r) => {
  const channel = 'channel, A 2840, F_y 300, F_u 450';
  r('gross yield', '13.2(a)(i)', channel, '767', 'kN', () => kN(csa.grossYield(2840, 300)));
  r('fracture', '13.2(a)(iii)', 'A_ne 0.75 × 2494', '631', 'kN', () =>
    kN(csa.netSectionResistance(0.75 * 2494, 450)),
  );
  r('block, U_t 1.0', '13.11', 'A_n 547, A_gv 2160', '549', 'kN', block(1, 547, 2160, 300, 450));
  r('block, U_t 0.6', '13.11', 'A_n 1521, A_gv 1080', '490', 'kN', block(0.6, 1521, 1080, 300, 450));
  r('tear-out', '13.11', 'A_gv 4320', '729', 'kN', block(0, 0, 4320, 300, 450));
});

const t15 = example('T15', (r) => {
  const angle = 'L178x102x13, A 3390, t 12.7, 350W, 8 3/4 in. A325 (2x4)';
  const bolt = { Ab: shank(19.05), Fu: 825, ...intercepted };
  r('gross yield', '13.2(a)(i)', angle, '1068', 'kN', () => kN(csa.grossYield(3390, 350)));
  r('net fracture, one leg', '12.3.3.2', `${angle}, 4 rows`, '750.7', 'kN', () =>
    kN(csa.netSectionResistance(csa.oneLegFactor(4) * (3390 - 2 * 24 * 12.7), 450)),
  );
  r('block, U_t 0.6', '13.11', 'A_n 977.9, A_gv 3302', '792.4', 'kN', block(0.6, 977.9, 3302, 350, 450));
  r('block, U_t 0.6', '13.11', 'A_n 711.2, A_gv 6604', '1333', 'kN', block(0.6, 711.2, 6604, 350, 450));
  r('tear-out', '13.11', 'A_gv 13208', '2377', 'kN', block(0, 0, 13208, 350, 450));
  r('bolt shear', '13.12.1.2(c)', '8 bolts, one plane', '632.1', 'kN', () =>
    kN(csa.boltShearResistance({ m: 8, ...bolt })),
  );
  r('bolt shear', '13.12.1.2(c)', '1 bolt, one plane', '79.0', 'kN', () =>
    kN(csa.boltShearResistance({ m: 1, ...bolt })),
  );
  r('bearing', '13.12.1.2(a)', 't 12.7', '2090', 'kN', () => kN(8 * csa.bearingResistance(12.7, 19.05, 450)));
});

const t30 = example('T30', (r) => {
  const laps = '2 PL10x230 350W, 6 3/4 in. A325, double shear';
  r('gross yield', '13.2(a)(i)', laps, '1449', 'kN', () => kN(csa.grossYield(2 * 10 * 230, 350)));
  r(
    'net fracture',
    '13.2(a)(iii)',
    `${laps}, A_n 3160`,
    '1066',
    'kN',
    () => kN(csa.netSectionResistance(3160, 450)),
    {},
  );
  r('block, U_t 1.0', '13.11', 'A_n 2040, A_gv 4600', '1516', 'kN', block(1, 2040, 4600, 350, 450));
  r('block, U_t 0.8', '13.11', 'A_n 2600, A_gv 2300', '1116', 'kN', block(0.8, 2600, 2300, 350, 450));
  r('block, U_t 0.6', '13.11', 'A_n 2140, A_gv 4600', '1261', 'kN', block(0.6, 2140, 4600, 350, 450));
  r('tear-out', '13.11', 'A_gv 13800', '2484', 'kN', block(0, 0, 13800, 350, 450));
  r('gross yield', '13.2(a)(i)', 'PL20x280 350W', '1764', 'kN', () => kN(csa.grossYield(20 * 280, 350)));
  r('net fracture', '13.2(a)(iii)', 'A_n 4160', '1404', 'kN', () => kN(csa.netSectionResistance(4160, 450)));
  r('bolt shear', '13.12.1.2(c)', laps, '948.1', 'kN', () =>
    kN(csa.boltShearResistance({ m: 12, Ab: shank(19.05), Fu: 825, ...intercepted })),
  );
  r('bearing', '13.12.1.2(a)', 't 20', '2469', 'kN', () => kN(6 * csa.bearingResistance(20, 19.05, 450)));
  r('fillet along', '13.13.2.2', '8 mm, E49XX, 4 × 100 mm', '497.6', 'kN', metal(8, 0, 1, 400), {
    roundedFirst: rounding('1/√2', 0.707, Math.SQRT1_2),
  });
});

const t11 = example('T-11', (r) => {
  r('gross yield', '13.2(a)(i)', 'PL16x120, F_y 300', '518', 'kN', () => kN(csa.grossYield(16 * 120, 300)));
  r('net fracture', '13.2(a)(iii)', 'pin plate, A_n 1504, F_u 440', '496', 'kN', () =>
    kN(csa.netSectionResistance(1504, 440)),
  );
});

/** Worked examples of the notes. */
export const holtzExamples: readonly Check[] = [
  ...c10,
  ...c30,
  ...c40,
  ...c50,
  ...cps,
  ...t04,
  ...t07,
  ...t11,
  ...t15,
  ...t30,
];

/** Printed values of the notes that do not follow from their own rule. */
export const holtzDisagreements: readonly Disagreement[] = [
  {
    id: 'csa-c40-across',
    published: '111 kN, 80 mm of 6 mm fillet at 90°',
    reason: 'Cut off in the notes: 0.67 × 0.67 × 4.243 × 490 × 1.5 × 80 is 111.98 kN, which is ours.',
  },
  {
    id: 'csa-c50-bearing',
    published: '931 kN, 4 M22 on 11.2 mm',
    reason: 'The notes put 0.7 where φ_br = 0.80 belongs; ours is 1064 kN. Not governing there.',
  },
  {
    id: 'csa-t-7-block',
    published: '1147 kN, U_t 0.9, A_n 1947, A_gv 2160',
    reason:
      'A slip: 0.75 (0.9 × 1947 × 0.45 + 0.6 × 2160 × 0.375) is 956 kN, which is ours. Not governing there.',
  },
  {
    id: 'csa-t30-inclined',
    published: '2008 kN, fillets loaded at 45°',
    reason: 'The notes leave out the 0.50 before sin^1.5 θ; with it the same welds take 1633 kN.',
  },
];
