import { describe, expect, it } from 'vitest';
import { oneCopeCriticalStress, twoCopesCriticalStress } from '@shared/engine/limit-states/coped-section.ts';
import { capacities, EN, plain, prepare } from './support/fin-plate.ts';

/**
 * Steel Buildings in Europe, Multi-Storey Steel Buildings Part 5, 3.4: fin plate 360 x 10 in S275 (275, 430), M20 class
 * 8.8 in holes of 22, 5 rows at 70 in 2 columns at 60, e_1 40, e_2 50, middle of the bolts 80 from the support.
 */
const published = {
  plate_thickness: 10,
  plate_steel: { fy: 275, fu: 430 },
  plate_end_distance: 40,
  plate_edge_distance: 50,
  bolt_size: { d: 20, stressArea: 245 },
  bolt_grade: { fyb: 640, fub: 800 },
  hole_diameter: 22,
  rows: 5,
  columns: 2,
  pitch: 70,
  gauge: 60,
  first_column: 50,
  beam_section: 'IPE550',
  beam_gap: 10,
  shear_line: 'support',
} as const;

describe('the published fin plate', () => {
  const found = capacities(prepare(EN, published), 90);

  it('bolts: 584 kN', () => expect(found.BS! / 1000).toBeCloseTo(584.07, 1));
  it('bearing on the plate: 605 kN with rounded intermediates, 600.4 without', () =>
    expect(found.PB! / 1000).toBeCloseTo(600.4, 1));
  it('gross shear with 1.27: 450 kN', () => expect(found.PV! / 1000).toBeCloseTo(450.06, 1));
  it('net shear: 497 kN', () => expect(found.PN! / 1000).toBeCloseTo(496.52, 1));
  it('block shear: 483 kN', () => expect(found.PX! / 1000).toBeCloseTo(483.32, 1));
  it('is no long plate: 50 is not beyond 10/0.15 = 67', () => expect(found.PL).toBe(Infinity));

  it('a single column of 3 M20 at 70, 60 from the support: 173 kN', () => {
    // Access Steel SX013a: 94.08 x 3/sqrt(1 + (6 x 60/(3 x 4 x 70) x 3)^2) = 173.28 kN.
    const single = { ...published, rows: 3, columns: 1, first_column: 60, beam_section: 'IPE300' };
    expect(capacities(prepare(EN, single), 90).BS! / 1000).toBeCloseTo(173.28, 1);
  });
});

describe('a fin plate by hand, EN 1993-1-8', () => {
  // h = 150 + 86 = 236; e = 62 + 33 = 95; polar = 6 x 33^2 + 4 x 75^2 = 6534 + 22 500 = 29 034.
  const shear = { ...plain, shear_line: 'support' };
  const found = capacities(prepare(EN, shear), -90);

  it('the farthest bolt takes shear and moment', () => {
    // F_x = 95 x 75/29 034 = 0.24540, F_y = 1/6 + 95 x 33/29 034 = 0.27465; F = 0.36831.
    // F_v,Rd = 0.6 x 800 x 303/1.25 = 116.352 kN: 315.91 kN.
    expect(found.BS! / 1000).toBeCloseTo(315.91, 1);
    // At the bolts there is no moment: 6 x 116.352.
    const direct = capacities(prepare(EN, { ...plain, shear_line: 'bolts' }), -90);
    expect(direct.BS! / 1000).toBeCloseTo(698.11, 1);
    expect(capacities(prepare(EN, plain), -90).BS).toBeCloseTo(found.BS!, 6);
  });

  it('an eccentricity given by number takes the place of the distance', () => {
    // e = 140: F_x = 0.36164, F_y = 1/6 + 0.15912 = 0.32579; F = 0.48674: 239.04 kN.
    const given = capacities(prepare(EN, { ...shear, eccentricity: 140 }), -90);
    expect(given.BS! / 1000).toBeCloseTo(239.04, 1);
  });

  it('the plate at the weld, elastic: pull, shear and moment', () => {
    // At 60 degrees, shear at the bolts: N 0.5, V 0.86603, M 82.272 on 11 x 236 = 2596, Z = 102 109.
    // sigma = 0.00019260 + 0.00080573 = 0.00099834; tau = 0.00033360; 1/sqrt(sigma^2 + 3 tau^2) = 867.1: x 280 = 242.8 kN.
    const pulled = capacities(prepare(EN, { ...plain, shear_line: 'bolts' }), 60);
    expect(pulled.PW! / 1000).toBeCloseTo(242.79, 1);
    // The bolts as the line: at the first column M = 0.86603 x 33 = 28.579, on the gross section sigma = 0.00047249.
    // Net: A = 11 (236 - 72) = 1804; I = 236^3/12 - 3 x 24^3/12 - 2 x 24 x 75^2 = 821 899 (x 11); Z = 76 618.
    // sigma = 0.00027716 + 0.00037301 = 0.00065017; tau = 0.00048006; sqrt(sigma^2 + 3 tau^2) = 0.00105551;
    // 0.9 x 420/1.25 = 302.4 MPa: 286.50 kN, below the 375.1 of the gross section.
    expect(pulled.PH! / 1000).toBeCloseTo(286.5, 1);
  });

  it('shear of the plate, gross with and without 1.27, and net', () => {
    // 2596 x 280/sqrt(3) = 419.67; /1.27 = 330.45; 1804 x 420/(sqrt(3) 1.25) = 349.96 kN.
    expect(found.PV! / 1000).toBeCloseTo(330.45, 1);
    expect(capacities(prepare(EN, { ...shear, gross_shear: 'full' }), -90).PV! / 1000).toBeCloseTo(419.67, 1);
    expect(found.PN! / 1000).toBeCloseTo(349.96, 1);
  });

  it('pull on the plate: the lesser of yield and rupture', () => {
    // 2596 x 280 = 726.9; 0.9 x 1804 x 420/1.25 = 545.5 kN; along the face there is no pull.
    expect(capacities(prepare(EN, plain), 0).PT! / 1000).toBeCloseTo(545.53, 1);
    expect(found.PT).toBe(Infinity);
  });

  it('blocks of the plate along, across and both', () => {
    // Along: A_nt = 11 (66 + 51 - 36) = 891, A_nv = 11 (193 - 60) = 1463:
    // 0.5 x 420 x 891/1.25 + 280 x 1463/sqrt(3) = 149 688 + 236 505 = 386.19 kN; evenly 535.88.
    expect(found.PX! / 1000).toBeCloseTo(386.19, 1);
    const even = capacities(prepare(EN, { ...shear, block_pull: 'even' }), -90);
    expect(even.PX! / 1000).toBeCloseTo(535.88, 1);
    // Across, between the rows: A_nt = 11 (150 - 48) = 1122, A_nv = 11 (234 - 72) = 1782: 376 992 + 288 075 = 665.07;
    // to an edge: A_nt = 11 (193 - 60) = 1463, A_nv = 891: 0.5 x 491 568 + 144 038 = 389.82 kN, the least.
    expect(capacities(prepare(EN, shear), 0).PX! / 1000).toBeCloseTo(389.82, 1);
    // At 45 degrees: 1/sqrt(0.5/386.19^2 + 0.5/389.82^2) = 387.99.
    expect(capacities(prepare(EN, shear), 45).PX! / 1000).toBeCloseTo(387.99, 1);
  });

  it('the web: coped above, pushed up by a beam that bears down', () => {
    // Depth left 390 - 61 = 329: A_gv = 8.5 x 329 = 2796.5, x 345/sqrt(3) = 557.02; net less 3 x 24 x 8.5 = 2184.5:
    // x 460/(sqrt(3) 1.25) = 464.14 kN.
    expect(found.MV! / 1000).toBeCloseTo(557.02, 1);
    expect(found.MN! / 1000).toBeCloseTo(464.14, 1);
    // Up: e = 116 - 61 = 55, A_nv = 8.5 (205 - 60) = 1232.5; A_nt = 8.5 (66 + 49 - 36) = 671.5:
    // 0.5 x 460 x 671.5/1.25 + 345 x 1232.5/sqrt(3) = 123 556 + 245 495 = 369.05 kN.
    const asGiven = { ...shear, shear_direction: 'by_angle' };
    expect(capacities(prepare(EN, asGiven), -90).MX! / 1000).toBeCloseTo(369.05, 1);
    // Down: 124 to the back of the flange, A_nv = 8.5 (274 - 60) = 1819: 123 556 + 362 317 = 485.87 kN.
    expect(capacities(prepare(EN, asGiven), 90).MX! / 1000).toBeCloseTo(485.87, 1);
    // Either way: the worse at both.
    expect(found.MX! / 1000).toBeCloseTo(369.05, 1);
    expect(capacities(prepare(EN, shear), 90).MX! / 1000).toBeCloseTo(369.05, 1);
  });

  it('pull on the web over the height of the plate', () => {
    // 236 x 8.5 = 2006 x 345 = 692.1; (236 - 72) 8.5 = 1394 x 0.9 x 460/1.25 = 461.7 kN.
    expect(capacities(prepare(EN, plain), 0).MT! / 1000).toBeCloseTo(461.69, 1);
    // At 60 degrees beside the net shear of 464.14: 1/sqrt((0.5/461.69)^2 + (0.86603/464.14)^2) = 463.5 kN.
    expect(capacities(prepare(EN, plain), 60).MT! / 1000).toBeCloseTo(463.5, 1);
    expect(found.MT).toBe(Infinity);
  });
});

describe('a long plate, EN 1993-1-8', () => {
  it('buckles sideways between weld and bolts', () => {
    // t 11, z_p 162 > 73.3; M_cr = pi x 236 x 11^3 x 210 000/sqrt(2.6)/(6 x 162) = 132.22 kNm; Z = 102 109 mm3.
    // lambda = sqrt(280 x 102 109/132.22e6) = 0.46501; curve c: phi = 0.5 (1 + 0.49 x 0.26501 + 0.21623) = 0.67304,
    // chi = 1/(phi + sqrt(phi^2 - 0.21623)) = 0.86236. M_b = 24.655 kNm over e = 195: 126.44 kN.
    const long = { ...plain, first_column: 162, fit_checks: 'waived', beam_gap: 113 };
    const found = capacities(prepare(EN, long), 90);
    expect(found.PL! / 1000).toBeCloseTo(126.44, 1);
    expect(capacities(prepare(EN, long), 30).PL! / 1000).toBeCloseTo(252.87, 1);
    expect(capacities(prepare(EN, long), 0).PL).toBe(Infinity);
  });
});

describe('the coped section of the beam, EN 1993-1-1', () => {
  // Left 329 of a web 8.5 and a flange 180 x 13: A = 316 x 8.5 + 2340 = 5026; centroid (2686 x 158 + 2340 x 322.5)/5026
  // = 234.588 from the coped edge; I = 22 384 056 + 2686 x 76.588^2 + 2340 x 87.912^2 = 56.224e6; Z = 239 672.
  const shear = { ...plain, shear_line: 'support' };

  it('bends under the shear from the face to the end of the cope', () => {
    // M = 103, sigma = 0.00042976, tau = 1/(329 x 8.5) = 0.00035759: 345/0.00075386 = 457.64 kN. f = 180/390,
    // k = 2.2 (329/90)^1.65 = 18.68, k_1 = 8.62: F_cr = 0.903 x 210 000 x 8.62/38.706^2 = 1091 MPa is above yield.
    expect(capacities(prepare(EN, shear), -90).MC! / 1000).toBeCloseTo(457.6, 0);
    // With the shear at the bolts the lever is 103 - 95 = 8.
    const near = { ...plain, shear_line: 'bolts' };
    const sigma = 8 / 239_672;
    const byHand = 345 / Math.sqrt(sigma ** 2 + 3 / (329 * 8.5) ** 2);
    expect(capacities(prepare(EN, near), -90).MC! / byHand).toBeCloseTo(1, 4);
  });

  it('is pulled off its centroid', () => {
    // The bolts sit 191 below the top of the beam; the centroid 61 + 234.588: 104.588 apart.
    const byHand = 345 / (1 / 5026 + 104.588 / 239_672);
    expect(capacities(prepare(EN, shear), 0).MC! / byHand).toBeCloseTo(1, 4);
  });

  it('does not apply to a beam without copes', () => {
    const whole = { ...plain, cope_top_length: 0, cope_top_depth: 0 };
    expect(capacities(prepare(EN, whole), -90).MC).toBe(Infinity);
  });

  it('buckles at long copes: in one flange as a plate, in both as a bar', () => {
    // One: c = 400 > h_0 = 200 and not above d = 450: f = 800/450, k = 2.2/2, k_1 = 1.956;
    // 0.903 x 210 000 x 1.956/(200/5)^2 = 231.8 MPa. Two: 1.9 x 210 000 x 25/(400 x 200) = 124.7 MPa.
    expect(oneCopeCriticalStress(210_000, 450, 200, 400, 5)).toBeCloseTo(231.8, 1);
    expect(twoCopesCriticalStress(210_000, 200, 400, 5)).toBeCloseTo(124.7, 1);
  });
});
