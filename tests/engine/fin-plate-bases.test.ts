import { describe, expect, it } from 'vitest';
import { ASD, capacities, CSA, EN, LRFD, plain, prepare, SANS } from './support/fin-plate.ts';

/**
 * The plain detail by hand, drilled holes of 24: plate 11 x 236, gross 2596, net 11 (236 - 3 d_h); 280/420 MPa;
 * beam web 8.5, 329 left below the cope, 345/460 MPa; 3 x 2 M22 at 75 x 66, 95 from the support; polar 29 034.
 */
const shear = { ...plain, shear_line: 'support', shear_direction: 'by_angle' } as const;
const web = 8.5 * 329;
/** Farthest bolt, unit shear 95 from the bolts: F_x = 95 x 75/29 034, F_y = 1/6 + 95 x 33/29 034. */
const fx = (95 * 75) / 29_034;
const fy = 1 / 6 + (95 * 33) / 29_034;
const farthest = Math.hypot(fx, fy);

describe('SANS 10162-1, drilled holes as they are', () => {
  const found = capacities(prepare(SANS, shear), -90);

  it('bolts: 0.60 φ_b A_b f_ub with threads in the plane', () => {
    // A_b = 380.13; 0.6 x 0.8 x 380.13 x 800 x 0.7 = 102 179 N.
    expect(found.BS!).toBeCloseTo(102_179.6 / farthest, -1);
  });

  it('plate: gross and net shear, block, pull', () => {
    // 0.60 x 0.9 x 2596 x 280; 0.60 x 0.9 x 11 x 164 x 420.
    expect(found.PV!).toBeCloseTo(0.54 * 2596 * 280, 6);
    expect(found.PN!).toBeCloseTo(0.54 * 1804 * 420, 6);
    // A_nt = 891, A_gv = 11 x 193 = 2123, A_nv = 1463: 0.9 (0.5 x 891 x 420 + 0.6 min(2123 x 280, 1463 x 420)).
    const block = 0.9 * (0.5 * 891 * 420 + 0.6 * Math.min(2123 * 280, 1463 * 420));
    expect(found.PX!).toBeCloseTo(block, 6);
    // min(0.9 x 2596 x 280, 0.85 x 0.9 x 1804 x 420).
    expect(capacities(prepare(SANS, shear), 0).PT!).toBeCloseTo(0.765 * 1804 * 420, 6);
  });

  it('bearing on the plate: the least of each direction, resolved', () => {
    // phi_br t f_u min(3 d, a) = 0.67 x 11 x 420 a: across, away from the support a = min(51, 66) = 51, towards it 66
    // (3 d = 66 and the gauge 66); down a = min(43, 75). The worst bolt is pushed away.
    const unit = 0.67 * 11 * 420;
    expect(found.PB!).toBeCloseTo(1 / Math.hypot(fx / (51 * unit), fy / (43 * unit)), 3);
  });

  it('bearing on the web, which is pushed up and towards its end', () => {
    // Towards the end a = min(49, 66) = 49, up to the cope a = min(55, 75) = 55: 0.67 x 8.5 x 460 a.
    const unit = 0.67 * 8.5 * 460;
    expect(found.MB!).toBeCloseTo(1 / Math.hypot(fx / (49 * unit), fy / (55 * unit)), 3);
  });

  it('web: shear, block, pull', () => {
    expect(found.MV!).toBeCloseTo(0.54 * web * 345, 6);
    expect(found.MN!).toBeCloseTo(0.54 * (web - 72 * 8.5) * 460, 6);
    // A_nt = 671.5, A_gv = 8.5 x 205 = 1742.5, A_nv = 1232.5.
    const block = 0.9 * (0.5 * 671.5 * 460 + 0.6 * Math.min(1742.5 * 345, 1232.5 * 460));
    expect(found.MX!).toBeCloseTo(block, 6);
    expect(capacities(prepare(SANS, shear), 0).MT!).toBeCloseTo(0.765 * 8.5 * 164 * 460, 6);
  });

  it('weld: shear at the bolts bends it, its end governs', () => {
    // Two fillets of 236: f_x = 95 x 118 x 6/(236^3)... = 6 x 95 x 118/236^3 per fillet, f_y = 1/472.
    const bent = capacities(prepare(SANS, { ...shear, shear_line: 'bolts' }), -90);
    const pull = (6 * 95 * 118) / 236 ** 3;
    const along = 1 / 472;
    const force = Math.hypot(pull, along);
    const sine = pull / force;
    const metal = 0.67 * 0.67 * (9 / Math.SQRT2) * 480 * (1 + 0.5 * sine ** 1.5);
    expect(bent.WM!).toBeCloseTo(metal / force, 3);
    // With the shear at the face the fillets are sheared alone: 472 mm.
    expect(found.WM!).toBeCloseTo(0.67 * 0.67 * (9 / Math.SQRT2) * 480 * 472, 3);
  });
});

describe('CSA S16', () => {
  const found = capacities(prepare(CSA, shear), -90);

  it('bolts, plate and web', () => {
    // 0.60 x 0.80 x 380.13 x 800 x 0.7.
    expect(found.BS!).toBeCloseTo(102_179.6 / farthest, -1);
    expect(found.PV!).toBeCloseTo(0.54 * 2596 * 280, 6);
    expect(found.PN!).toBeCloseTo(0.45 * 1804 * 420, 6);
    // Two columns: U_t = 0.3; 0.75 (0.3 x 891 x 420 + 0.6 x 2123 x (280 + 420)/2), and two planes a column torn out.
    expect(found.PX!).toBeCloseTo(0.75 * (0.3 * 891 * 420 + 0.6 * 2123 * 350), 6);
    expect(found.MX!).toBeCloseTo(0.75 * (0.3 * 671.5 * 460 + 0.6 * 1742.5 * 402.5), 6);
    // One column: U_t = 0.9 with 11 (51 - 12) = 429.
    const single = capacities(prepare(CSA, { ...shear, columns: 1 }), -90);
    expect(single.PX!).toBeCloseTo(0.75 * (0.9 * 429 * 420 + 0.6 * 2123 * 350), 6);
  });

  it('bearing knows no end distance: 3 φ_br t d F_u', () => {
    expect(found.PB!).toBeCloseTo((3 * 0.8 * 11 * 22 * 420) / farthest, 3);
    expect(found.MB!).toBeCloseTo((3 * 0.8 * 8.5 * 22 * 460) / farthest, 3);
  });
});

describe.each([
  [LRFD, { yielding: 0.9, shear: 1, rupture: 0.75 }],
  [ASD, { yielding: 1 / 1.67, shear: 1 / 1.5, rupture: 1 / 2 }],
] as const)('%s, holes deducted 2 mm over', (basis, factor) => {
  const found = capacities(prepare(basis, shear), -90);
  // 11 (236 - 3 x 26) = 1738.
  const net = 1738;

  it('plate: shear, block with U_bs 0.5, pull', () => {
    expect(found.PV!).toBeCloseTo(factor.shear * 0.6 * 2596 * 280, 6);
    expect(found.PN!).toBeCloseTo(factor.rupture * 0.6 * net * 420, 6);
    // A_nt = 11 (117 - 39) = 858, A_gv = 2123, A_nv = 11 (193 - 65) = 1408.
    const block = 0.6 * Math.min(1408 * 420, 2123 * 280) + 0.5 * 858 * 420;
    expect(found.PX!).toBeCloseTo(factor.rupture * block, 6);
    const pull = Math.min(factor.yielding * 2596 * 280, factor.rupture * net * 420);
    expect(capacities(prepare(basis, shear), 0).PT!).toBeCloseTo(pull, 6);
  });

  it('bearing and tear-out of the worst bolt, resolved', () => {
    // Away: l_c = min(51 - 12, 66 - 24) = 39; down: min(43 - 12, 75 - 24) = 31; 1.2 l_c below 2.4 d = 52.8.
    const unit = factor.rupture * 1.2 * 11 * 420;
    expect(found.PB!).toBeCloseTo(1 / Math.hypot(fx / (39 * unit), fy / (31 * unit)), 3);
    const accepted = capacities(prepare(basis, { ...shear, hole_deformation: 'accepted' }), -90);
    expect(accepted.PB!).toBeCloseTo(1.25 * found.PB!, 3);
  });

  it('web: shear and block at the cope', () => {
    expect(found.MV!).toBeCloseTo(factor.shear * 0.6 * web * 345, 6);
    expect(found.MN!).toBeCloseTo(factor.rupture * 0.6 * (web - 78 * 8.5) * 460, 6);
    // A_nt = 8.5 (115 - 39) = 646, A_gv = 1742.5, A_nv = 8.5 (205 - 65) = 1190.
    const block = 0.6 * Math.min(1190 * 460, 1742.5 * 345) + 0.5 * 646 * 460;
    expect(found.MX!).toBeCloseTo(factor.rupture * block, 6);
  });

  it('an eccentric weld takes no increase for its direction', () => {
    const bent = capacities(prepare(basis, { ...shear, shear_line: 'bolts' }), -90);
    const force = Math.hypot((6 * 95 * 118) / 236 ** 3, 1 / 472);
    expect(bent.WM!).toBeCloseTo((factor.rupture * 0.6 * 480 * 9) / Math.SQRT2 / force, 3);
  });
});

describe.each([
  [SANS, { yielding: 0.9, rupture: 0.765, hole: 24 }],
  [CSA, { yielding: 0.9, rupture: 0.75, hole: 24 }],
  [LRFD, { yielding: 0.9, rupture: 0.75, hole: 26 }],
  [ASD, { yielding: 1 / 1.67, rupture: 1 / 2, hole: 26 }],
] as const)('%s, sections with pull, shear and bending', (basis, factor) => {
  const pulled = capacities(prepare(basis, { ...shear, shear_line: 'bolts' }), 60);

  it('the plate at the weld', () => {
    // N 0.5, V 0.86603, M 82.272 on 2596 mm2 and Z = 11 x 236^2/6 = 102 109.
    const sigma = 0.5 / 2596 + 82.272 / 102_109.3;
    const tau = 0.866025 / 2596;
    const byHand = (factor.yielding * 280) / Math.hypot(sigma, Math.sqrt(3) * tau);
    expect(pulled.PW! / byHand).toBeCloseTo(1, 5);
  });

  it('the plate at the first column, where the net section governs', () => {
    // M = 0.86603 x 33; I = 236^3/12 - 3 d^3/12 - 2 d 75^2, all by 11.
    const d = factor.hole;
    const area = 11 * (236 - 3 * d);
    const modulus = (11 * (236 ** 3 / 12 - d ** 3 / 4 - 2 * d * 75 ** 2)) / 118;
    const sigma = 0.5 / area + (0.866025 * 33) / modulus;
    const byHand = (factor.rupture * 420) / Math.hypot(sigma, (Math.sqrt(3) * 0.866025) / area);
    expect(pulled.PH! / byHand).toBeCloseTo(1, 5);
  });

  it('pull on the web, and the coped section', () => {
    const net = 8.5 * (236 - 3 * factor.hole);
    const pull = Math.min(factor.yielding * 2006 * 345, factor.rupture * net * 460);
    expect(capacities(prepare(basis, shear), 0).MT!).toBeCloseTo(pull, 6);
    // Z = 239 672 as in EN; M = 103; far below its buckling.
    const combined = Math.hypot(103 / 239_672, Math.sqrt(3) / 2796.5);
    expect(capacities(prepare(basis, shear), -90).MC! / ((factor.yielding * 345) / combined)).toBeCloseTo(
      1,
      4,
    );
  });
});

describe('a long plate', () => {
  const long = { ...plain, first_column: 162, fit_checks: 'waived', beam_gap: 113 } as const;
  // M_cr/Z = pi h t^3 E/(6 z_p sqrt(2.6) Z) with E 200 000: 125.93e6/102 109 = 1233.3 MPa; e = 195.
  const critical = (Math.PI * 236 * 11 ** 3 * 200_000) / Math.sqrt(2.6) / (6 * 162) / 102_109.3;

  it('SANS and CSA: φ f_y (1 + λ^2n)^(−1/n), n = 1.34', () => {
    const lambda = Math.sqrt(280 / critical);
    const stress = 0.9 * 280 * (1 + lambda ** 2.68) ** (-1 / 1.34);
    for (const basis of [SANS, CSA] as const) {
      const found = capacities(prepare(basis, long), 90).PL!;
      expect(found / ((stress * 102_109.3) / 195)).toBeCloseTo(1, 5);
    }
  });

  it('AISC: 0.658^(F_y/F_e) F_y', () => {
    const stress = 0.9 * 0.658 ** (280 / critical) * 280;
    expect(capacities(prepare(LRFD, long), 90).PL! / ((stress * 102_109.3) / 195)).toBeCloseTo(1, 5);
  });
});

describe('bolts by the instantaneous centre', () => {
  const centre = { ...shear, bolt_group: 'centre' } as const;

  it('carry at least what they carry elastically, and what they carry without moment at 0°', () => {
    for (const basis of [SANS, CSA, LRFD, ASD] as const) {
      for (const angle of [-90, -35, 10, 60, 90]) {
        const found = capacities(prepare(basis, centre), angle);
        const elastic = capacities(prepare(basis, shear), angle);
        expect(found.BS!).toBeGreaterThan(elastic.BS!);
        expect(found.PB).toBe(elastic.PB);
      }
    }
    const pull = capacities(prepare(SANS, centre), 0).BS!;
    // Six bolts of 102 180 N that deform alike to the greatest: R/R_ult = (1 - exp(-3.4))^0.55 = 0.98154.
    expect(pull).toBeCloseTo(6 * 102_179.6 * 0.98154, -2);
    expect(capacities(prepare(CSA, centre), 0).BS!).toBeCloseTo(6 * 102_179.6, -1);
  });

  it('are not for EN 1993', () => {
    expect(capacities(prepare(EN, centre), 90)).toEqual(capacities(prepare(EN, shear), 90));
  });
});
