import type { DetailGeometry, Dimension, Point } from '../../types.ts';
import { elevationOf } from '../beam-end/elevation.ts';
import type { CleatModel } from './model.ts';
import { box, faceView, number, planView, rowsOf } from './views.ts';

/** Clear of the cleat, mm: how far the line of the load is drawn beyond it. */
const BEYOND = 60;

/** The web leg from the side with the beam, a plan and the outstanding legs; the load angle, radians, turns its line alone. */
export function geometryOf(m: CleatModel, theta: number): DetailGeometry {
  const { height, legs, bolts, weld } = m;
  const half = height / 2;
  const reach = legs.webLeg + 0.4 * m.beam.section.depth;
  const behind = Math.max(m.supportThickness, legs.thickness);
  const toe = { from: { x: 0, y: -half }, to: { x: 0, y: half } };
  return {
    outline: box(0, legs.webLeg, -half, half),
    holes: holesOf(m),
    welds: weld === null ? [] : [{ ...toe, leg: weld.leg, bothSides: legs.cleats === 2 }],
    member: [{ outline: box(0, legs.thickness, -half, half), hidden: false }, ...elevationOf(m.beam, reach)],
    bolts: (bolts === null ? [] : rowsOf(bolts.group)).map((y) => ({
      from: { x: legs.thickness, y },
      to: { x: -behind, y },
      diameter: bolts?.bolt.size.d ?? 0,
    })),
    axis: axisOf(m, theta),
    dimensions: dimensionsOf(m),
    thickness: legs.thickness,
    views: [planView(m, reach, behind), faceView(m)],
  };
}

/** From where the shear acts, along the load, to beyond the cleat. */
function axisOf(m: CleatModel, theta: number): DetailGeometry['axis'] {
  const from = { x: m.lines.boltLevers.includes(0) ? m.lines.eccentricity : 0, y: 0 };
  const reach = Math.max(m.legs.webLeg, m.height / 2) + BEYOND;
  return { from, to: { x: from.x + reach * Math.cos(theta), y: reach * Math.sin(theta) } };
}

function holesOf(m: CleatModel): DetailGeometry['holes'] {
  const { rows, columns, pitch, gauge } = m.group;
  return Array.from({ length: rows * columns }, (_, bolt) => {
    const row = Math.floor(bolt / columns);
    const x = m.legs.firstColumn + (bolt % columns) * gauge;
    return { centre: { x, y: (row - (rows - 1) / 2) * pitch }, diameter: m.bolt.holeDiameter };
  });
}

function dimensionsOf(m: CleatModel): Dimension[] {
  const { height } = m;
  const { webLeg, firstColumn, lastColumn, endDistance } = m.legs;
  const { rows, columns, pitch, gauge } = m.group;
  const half = height / 2;
  const low = -half;
  const lowest = low + endDistance;
  const level = (from: number, to: number): Dimension => ({
    from: { x: from, y: low },
    to: { x: to, y: low },
    text: number(to - from),
    offset: -30,
  });
  // Beside the toe: on the other side stand the bolts at the support.
  const upright = (from: number, to: number, text: string, offset = -30): Dimension => {
    const at = (y: number): Point => ({ x: webLeg, y });
    return { from: at(from), to: at(to), text, offset };
  };
  const dimensions = [
    upright(low, half, number(height), -60),
    level(0, firstColumn),
    level(lastColumn, webLeg),
    upright(low, lowest, number(endDistance)),
  ];
  if (columns > 1) dimensions.push(level(firstColumn, firstColumn + gauge));
  if (rows > 1) {
    const text = rows === 2 ? number(pitch) : `${rows - 1} × ${number(pitch)}`;
    dimensions.push(upright(lowest, half - endDistance, text));
  }
  return dimensions;
}
