import type { UprightGroup } from '../../limit-states/upright-group.ts';
import { groupHeight } from '../../limit-states/upright-group.ts';
import type { UprightPly } from '../../limit-states/upright-block.ts';
import { PulledBolts } from '../../limit-states/bolts-pulled.ts';
import { StubRows } from '../../limit-states/t-stub.ts';
import type {
  Basis,
  BearingPly,
  BearingStrength,
  BoltInShear,
  EdgeFinish,
  FilletStrength,
  HoleMaking,
} from '../../standards/basis.ts';
import type { ISection, Steel } from '../../types.ts';
import { isChosen } from '../given.ts';
import { boltOf, noGrade, normalHole, noSteel, plateOf, type WeldedPlate } from '../parts.ts';
import { type Resolved, steelAt } from '../resolved.ts';
import { methodParameters } from './parameters.ts';

/** Everything about one end plate that does not change with the load angle. N, mm, MPa; y from the middle of the bolts. */
export interface EndPlateModel extends WeldedPlate {
  readonly values: Resolved;
  readonly basis: Basis;
  readonly gradeMissing: boolean;
  readonly flush: boolean;
  readonly section: ISection;
  readonly beamSteel: Steel;
  readonly bolt: BoltInShear;
  /** Shear of one bolt. */
  readonly oneBolt: number;
  /** Tension of one bolt. */
  readonly boltTension: number;
  /** One column of bolts: each side of the web holds one. */
  readonly group: UprightGroup;
  readonly bolts: number;
  /** Between the two bolts of a row. */
  readonly crossCentres: number;
  readonly height: number;
  readonly width: number;
  readonly endDistance: number;
  readonly edgeDistance: number;
  /** Height of the middle of the bolts above the middle of the beam's depth. */
  readonly offset: number;
  readonly topToRow: number;
  readonly deduction: number;
  readonly finish: EdgeFinish;
  readonly weldLeg: number;
  readonly weldLength: number;
  readonly fillet: FilletStrength;
  readonly ply: UprightPly;
  readonly plateBearing: BearingStrength;
  /** Null where the support's thickness is not given. */
  readonly supportBearing: BearingStrength | null;
  readonly stub: StubRows;
  readonly pulled: PulledBolts;
  /** Bolt to the face of the web, and to the yield line beside the weld. */
  readonly boltToWeb: number;
  readonly m: number;
  readonly boltShare: number;
  readonly grossShearFactor: number;
  readonly webShare: number;
  readonly eccentricBlock: boolean;
  readonly fitWaived: boolean;
  readonly practiceWaived: boolean;
}

/** Handbooks of simple connections: shear of the support's bolts, gross shear of the plate, height of the web. */
const HANDBOOK = { bolts: 0.8, shear: 1.27, web: 0.9 };

/** Mean of the widths of a hexagon head across flats and points, by bolt diameter, taken as across flats (errs low). */
const HEAD = 1.5;

/** Puts checked parameters and a basis together. */
export function buildModel(values: Resolved, basis: Basis): EndPlateModel {
  const plate = plateOf(values);
  const { thickness } = plate;
  const group: UprightGroup = {
    rows: values.number('rows'),
    columns: 1,
    pitch: values.number('pitch'),
    gauge: 0,
  };
  const section = values.section<ISection>('beam_section');
  const beamSteel = steelAt(values.steel('beam_steel'), section.webThickness, null) ?? noSteel;
  const reduced = values.choice('long_joint') === 'reduced';
  const bolt = boltOf(values, basis, 1, reduced ? groupHeight(group) : 0);
  const deduction = bolt.holeDiameter + basis.holeAllowance(values.choice<HoleMaking>('hole_making'));
  const crossCentres = values.number('gauge');
  const endDistance = values.number('plate_end_distance');
  const width = values.number('plate_width');
  const weldLeg = values.number('weld_leg');
  const height = groupHeight(group) + 2 * endDistance;
  const edgeDistance = (width - crossCentres) / 2;
  const boltToWeb = Math.max(1, (crossCentres - section.webThickness) / 2);
  // EN 1993-1-8:2005, Figure 6.8: 0.8 √2 a from the face of the web, which is 0.8 of the leg.
  const m = Math.max(1, boltToWeb - 0.8 * weldLeg);
  const { fy, fu } = plate.plate;
  const stub = new StubRows(basis, {
    thickness,
    steel: plate.plate,
    byTensile: values.choice('plate_bending') === 'tensile',
    bolt: bolt.size,
    holeDiameter: bolt.holeDiameter,
    perRow: 2,
    rows: group.rows,
    pitch: group.pitch,
    end: endDistance,
    boltToWeb,
    m,
    edge: Math.max(1, edgeDistance),
  });
  const boltShare = isChosen(methodParameters, values, basis, 'support_bolts', 'reduced')
    ? HANDBOOK.bolts
    : 1;
  const oneBolt = basis.boltShear(bolt, null);
  const boltTension = tensionOf(basis, bolt, plate);
  const weld = weldOf(values, basis, plate, section, beamSteel, height);
  const topToRow = values.number('beam_top_to_row');
  const aboveRow = topToRow === 0 ? (section.depth - groupHeight(group)) / 2 : topToRow;
  const ply = (t: number, tensile: number): BearingPly => ({
    size: bolt.size,
    grade: bolt.grade,
    holeDiameter: bolt.holeDiameter,
    normalHole: normalHole(values, basis) ?? bolt.holeDiameter,
    thickness: t,
    fu: tensile,
    singleLapOneRow: group.rows === 1,
    boltShear: oneBolt,
    deformationMatters: values.choice('hole_deformation') === 'limited',
  });
  const { supportThickness } = plate;
  return {
    thickness,
    plate: plate.plate,
    support: plate.support,
    supportThickness,
    values,
    basis,
    gradeMissing: bolt.grade === noGrade,
    flush: values.choice('depth') === 'flush',
    section,
    beamSteel,
    bolt,
    oneBolt,
    boltTension,
    group,
    bolts: 2 * group.rows,
    crossCentres,
    height,
    width,
    endDistance,
    edgeDistance,
    offset: (section.depth - groupHeight(group)) / 2 - aboveRow,
    topToRow: aboveRow,
    deduction,
    finish: values.choice<EdgeFinish>('edge_finish'),
    weldLeg,
    weldLength: weld.length,
    fillet: weld.fillet,
    ply: { thickness, deduction, fy, fu },
    plateBearing: basis.bearing(ply(thickness, fu)),
    supportBearing: supportThickness > 0 ? basis.bearing(ply(supportThickness, plate.support.fu)) : null,
    stub,
    pulled: new PulledBolts(basis, stub, boltTension, boltShare * oneBolt),
    boltToWeb,
    m,
    boltShare,
    grossShearFactor: isChosen(methodParameters, values, basis, 'gross_shear', 'reduced')
      ? HANDBOOK.shear
      : 1,
    webShare: isChosen(methodParameters, values, basis, 'web_shear', 'reduced') ? HANDBOOK.web : 1,
    eccentricBlock: values.choice('block_pull') === 'eccentric',
    fitWaived: values.choice('fit_checks') === 'waived',
    practiceWaived: values.choice('practice_rules') === 'waived',
  };
}

/** Of the plate and the support the ply that a head is drawn through more easily. */
function tensionOf(basis: Basis, bolt: BoltInShear, plate: WeldedPlate): number {
  const { size, grade } = bolt;
  const headDiameter = HEAD * size.d;
  const through = (plateThickness: number, plateFu: number) =>
    basis.boltTension({ size, grade, headDiameter, plateThickness, plateFu }, null);
  const own = through(plate.thickness, plate.plate.fu);
  return plate.supportThickness > 0 ? Math.min(own, through(plate.supportThickness, plate.support.fu)) : own;
}

/** The two fillets between the web and the plate: strength and counted length, which a flush plate ends at the flanges. */
function weldOf(
  values: Resolved,
  basis: Basis,
  plate: WeldedPlate,
  section: ISection,
  beamSteel: Steel,
  height: number,
) {
  const { webThickness, depth, flangeThickness, rootRadius } = section;
  const fillet = basis.fillet({
    leg: values.number('weld_leg'),
    xu: values.electrode('electrode').xu,
    parts: [
      { name: beamSteel.name, fy: beamSteel.fy, fu: beamSteel.fu, thickness: webThickness, fillets: 2 },
      {
        name: plate.plate.name,
        fy: plate.plate.fy,
        fu: plate.plate.fu,
        thickness: plate.thickness,
        fillets: 1,
      },
    ],
    directional: values.choice('weld_method') === 'directional',
    concentric: true,
    matching: values.choice('electrode_match') === 'matching',
  });
  const clear = Math.min(height, depth - 2 * (flangeThickness + rootRadius));
  const deducted = values.choice('weld_ends') === 'deducted' ? fillet.runOut : 0;
  return { fillet, length: Math.max(1, clear - deducted) };
}
