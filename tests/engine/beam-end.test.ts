import { describe, expect, it } from 'vitest';
import { catalogue, toEngineCatalogue } from '@catalog/index.ts';
import { beamEndOf } from '@shared/engine/kinds/beam-end/beam.ts';
import { beamParameters } from '@shared/engine/kinds/beam-end/parameters.ts';
import { checkBeamEnd } from '@shared/engine/kinds/beam-end/rules.ts';
import { webBlockAcross, webBlockAlong, webTension } from '@shared/engine/kinds/beam-end/strengths.ts';
import { Rejections } from '@shared/engine/kinds/rules.ts';
import { validateParameters } from '@shared/engine/kinds/validate.ts';
import { GroupBearing } from '@shared/engine/limit-states/group-bearing.ts';
import type { BearingPly } from '@shared/engine/standards/basis.ts';
import { createBasis } from '@shared/engine/standards/registry.ts';
import type { BasisId, ParameterValues } from '@shared/engine/types.ts';

const engine = toEngineCatalogue(catalogue);
const basisOf = (id: BasisId) => createBasis(id, undefined)!;
const noSteel = { name: 'none', fy: 1, fu: 1 };

function beamOf(
  values: ParameterValues,
  group: Parameters<typeof beamEndOf>[1],
  first: number,
  hole: number,
) {
  const checked = validateParameters(beamParameters, values, engine);
  if (!checked.ok) throw new Error(JSON.stringify(checked.faults));
  return beamEndOf(checked.values, group, first, hole, noSteel);
}

/**
 * Steel Buildings in Europe, Multi-Storey Steel Buildings Part 5: web cleats to an IPE A 550 in S275 (275, 430), web
 * 9 mm; 6 M20 class 8.8 in holes of 22, pitch 70; 90 to the top of the beam, 40 to its end.
 */
const published = {
  group: { rows: 6, columns: 1, pitch: 70, gauge: 60 },
  beam: { beam_section: 'IPEA550', beam_steel: { fy: 275, fu: 430 }, beam_top_to_row: 90, beam_gap: 10 },
};
const en = basisOf('en-1993-1-8-2005');
const m20 = { name: 'M20', d: 20, stressArea: 245 };
const ply: BearingPly = {
  size: m20,
  grade: { name: '8.8', fyb: 640, fub: 800 },
  holeDiameter: 22,
  normalHole: 22,
  thickness: 9,
  fu: 430,
  singleLapOneRow: false,
  boltShear: 188_160,
  deformationMatters: true,
};

describe('the web of a beam, EN 1993-1-8', () => {
  const { group } = published;
  const beam = beamOf(published.beam, group, 50, 22);

  it('tears along the face as published: 501 kN', () => {
    // A_nt = 9 (40 - 11) = 261; A_nv = 9 (90 + 350 - 5.5 x 22) = 2871.
    // 0.5 x 430 x 261/1.25 + 275 x 2871/sqrt(3) = 44 892 + 455 831 = 500 723 N.
    const block = webBlockAlong(en, beam, group, true, true, null);
    expect(block / 1000).toBeCloseTo(501, 0);
    expect(block).toBeCloseTo(500_723, -1);
  });

  it('bears on eccentric bolts as published: 583 kN', () => {
    // Lever 50: F_y = 1/6, F_x = 50 x 175/85 750 = 0.10204 at the outer bolts. Upwards alpha_b = 70/66 - 1/4 = 0.8106,
    // 125.48 kN; towards the end of the beam 40/66 = 0.6061, 93.82 kN: 1/sqrt((0.16667/125.48)^2 + (0.10204/93.82)^2).
    const strength = en.bearing(ply);
    const least = new GroupBearing(en, strength, strength, group, beam.edges, 188_160, true);
    const heights = [-175, -105, -35, 35, 105, 175];
    const fx = Float64Array.from(heights, (y) => (-50 * y) / 85_750);
    const fy = new Float64Array(6).fill(1 / 6);
    expect(least.capacity(fx, fy, 1, null) / 1000).toBeCloseTo(582.5, 1);
    expect(least.capacity(fx, fy, -1, null) / 1000).toBeCloseTo(582.5, 1);
    // With its own distances the outer bolt has 90 ahead: alpha_b = 1, 2.5 x 430 x 20 x 9/1.25 = 154.8 kN, and
    // 93.82 kN towards the end of the beam: 1/sqrt((0.10204/93.82)^2 + (0.16667/154.8)^2) = 653.4 kN.
    const each = new GroupBearing(en, strength, strength, group, beam.edges, 188_160, false);
    expect(each.capacity(fx, fy, 1, null) / 1000).toBeCloseTo(653.4, 1);
    // 3.7: with the shear of one bolt, 120 kN, below the bearing of some the least is taken throughout.
    const weakBolt = new GroupBearing(en, strength, strength, group, beam.edges, 120_000, false);
    expect(weakBolt.capacity(fx, fy, 1, null)).toBe(least.capacity(fx, fy, 1, null));
  });

  it('tears towards its end between the outer rows', () => {
    // A_nt = 9 (350 - 5 x 22) = 2160; A_nv = 9 x 2 (40 - 11) = 522.
    // 430 x 2160/1.25 + 275 x 522/sqrt(3) = 743 040 + 82 879 = 825 919 N.
    expect(webBlockAcross(en, beam, group, null)).toBeCloseTo(825_919, -1);
  });

  it('is pulled over the height of the cleat', () => {
    // 430 high: gross 3870 x 275 = 1064.3; net (430 - 132) 9 x 0.9 x 430/1.25 = 830.3 kN.
    expect(webTension(en, beam, group, 430, null) / 1000).toBeCloseTo(830.3, 1);
  });
});

describe('copes', () => {
  const group = { rows: 3, columns: 2, pitch: 70, gauge: 60 };
  const values = { beam_section: 'IPE400', cope_top_length: 120, cope_top_depth: 60, beam_top_to_row: 110 };
  const setting = (given: ParameterValues) => ({
    basis: en,
    beam: beamOf({ ...values, ...given }, group, 60, 22),
    d: 20,
    holeDiameter: 22,
    rows: 3,
    columns: 2,
    finish: 'sheared' as const,
    outerThickness: 8.6,
    exposed: true,
    partAbove: 40,
    partBelow: 40,
    fitWaived: false,
  });
  const broken = (given: ParameterValues) => {
    const found = new Rejections();
    checkBeamEnd(setting(given), found);
    return found.list.map(({ rule }) => rule);
  };

  it('shorten the edges and the depth', () => {
    const { beam } = setting({});
    expect(beam.edges).toEqual({ near: 50, far: Infinity, above: 50, below: 150 });
    expect(beam.depthLeft).toBe(340);
    // One flange left with a root radius of 21: (400 - 60) 8.6 = 2924.
    expect(beam.shearArea).toBeCloseTo(2924, 9);
    // The bolts' middle is 180 below the top, 20 above the middle of the depth.
    expect(beam.offset).toBe(20);
  });

  it('tear towards the coped edge in the basis given for coped ends', () => {
    // SANS: A_nt = 8.6 (60 + 50 - 1.5 x 24) = 636.4; A_gv = 8.6 (140 + 50) = 1634; A_nv = 8.6 (190 - 2.5 x 24) = 1118.
    // 0.9 (0.5 x 636.4 x 470 + 0.6 min(1634 x 355, 1118 x 470)) = 418.4 kN; S355 as EN 10025-2 has it.
    const sans = basisOf('sans-10162-1-2011');
    const beam = beamOf({ ...values, beam_steel: { fy: 355, fu: 470 } }, group, 60, 24);
    const byHand = 0.9 * (0.5 * 636.4 * 470 + 0.6 * Math.min(1634 * 355, 1118 * 470));
    expect(webBlockAlong(sans, beam, group, true, true, null)).toBeCloseTo(byHand, 6);
    // AISC, two lines at a coped end: U_bs = 0.5, factor 0.75.
    const aisc = basisOf('aisc-360-2022-lrfd');
    const us = 0.75 * (0.6 * Math.min(1118 * 470, 1634 * 355) + 0.5 * 636.4 * 470);
    expect(webBlockAlong(aisc, beam, group, true, true, null)).toBeCloseTo(us, 6);
  });

  it('are whole, deep enough and leave half of the beam', () => {
    expect(broken({})).toEqual([]);
    expect(broken({ cope_top_length: 0 })).toContain('cope-whole');
    expect(broken({ cope_top_depth: 30 })).toEqual(['cope-depth-least']);
    expect(broken({ cope_bottom_length: 120, cope_bottom_depth: 145 })).toContain('cope-web-left');
    expect(broken({ beam_top_to_row: 80 })).toEqual(['web-edge-least']);
  });

  it('leave bolts and plate inside the flanges', () => {
    const plain = { cope_top_length: 0, cope_top_depth: 0 };
    expect(broken(plain)).toEqual([]);
    // 13.5 + 21 to the end of the radius, 17 for the nut: 51.5 to the back of the flange.
    expect(broken({ ...plain, beam_top_to_row: 51 })).toEqual(['web-root-clear', 'part-inside-web']);
    expect(broken({ ...plain, beam_top_to_row: 52 })).toEqual(['part-inside-web']);
    expect(broken({ ...plain, beam_top_to_row: 20 })).toContain('web-hole-inside');
    expect(broken({ ...plain, beam_gap: 36 })).toEqual(['web-end-least']);
  });
});
