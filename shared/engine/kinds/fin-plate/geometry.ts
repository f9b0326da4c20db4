import type { DetailGeometry, Dimension, Point } from '../../types.ts';
import { elevationOf } from '../beam-end/elevation.ts';
import type { FinPlateModel } from './model.ts';
import { planView } from './plan-view.ts';

/** Clear of the plate, mm: how far the line of the load is drawn beyond it, and where dimensions stand. */
const BEYOND = 60;

/** Outlines, holes, weld and dimensions; the load angle, radians, turns its line alone. */
export function geometryOf(m: FinPlateModel, theta: number): DetailGeometry {
  const { height, width, weldLeg, thickness } = m;
  const half = height / 2;
  const reach = width + 0.4 * m.beam.section.depth;
  return {
    outline: [
      { x: 0, y: -half },
      { x: width, y: -half },
      { x: width, y: half },
      { x: 0, y: half },
    ],
    holes: holesOf(m),
    welds: [{ from: { x: 0, y: -half }, to: { x: 0, y: half }, leg: weldLeg, bothSides: true }],
    member: elevationOf(m.beam, reach),
    axis: axisOf(m, theta),
    dimensions: dimensionsOf(m),
    thickness,
    views: [planView(m, reach)],
  };
}

/** From where the shear acts, along the load, to beyond the plate. */
function axisOf(m: FinPlateModel, theta: number): DetailGeometry['axis'] {
  const from = { x: m.lines.boltLevers.includes(0) ? m.lines.eccentricity : 0, y: 0 };
  const reach = Math.max(m.width, m.height / 2) + BEYOND;
  return { from, to: { x: from.x + reach * Math.cos(theta), y: reach * Math.sin(theta) } };
}

function holesOf(m: FinPlateModel): DetailGeometry['holes'] {
  const { rows, columns, pitch, gauge } = m.group;
  return Array.from({ length: rows * columns }, (_, bolt) => {
    const row = Math.floor(bolt / columns);
    const x = m.firstColumn + (bolt % columns) * gauge;
    return { centre: { x, y: (row - (rows - 1) / 2) * pitch }, diameter: m.bolt.holeDiameter };
  });
}

function dimensionsOf(m: FinPlateModel): Dimension[] {
  const { height, width, firstColumn, lastColumn, endDistance } = m;
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
  const upright = (from: number, to: number, text: string): Dimension => {
    const at = (y: number): Point => ({ x: width, y });
    return { from: at(from), to: at(to), text, offset: -30 };
  };
  const dimensions = [
    { from: { x: 0, y: low }, to: { x: 0, y: half }, text: number(height), offset: 30 },
    level(0, firstColumn),
    level(lastColumn, width),
    upright(low, lowest, number(endDistance)),
  ];
  if (columns > 1) dimensions.push(level(firstColumn, firstColumn + gauge));
  if (rows > 1) {
    const text = rows === 2 ? number(pitch) : `${rows - 1} × ${number(pitch)}`;
    dimensions.push(upright(lowest, half - endDistance, text));
  }
  return dimensions;
}

function number(value: number): string {
  return String(Math.round(value * 10) / 10);
}
