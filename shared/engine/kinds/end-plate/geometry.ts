import type { DetailGeometry, DetailView, Dimension, Point } from '../../types.ts';
import type { EndPlateModel } from './model.ts';

/** How far the line of the load is drawn beyond the plate, and the beam beyond it by its depth. */
const BEYOND = 160;

const box = (x0: number, x1: number, y0: number, y1: number): Point[] => [
  { x: x0, y: y0 },
  { x: x1, y: y0 },
  { x: x1, y: y1 },
  { x: x0, y: y1 },
];
const number = (value: number): string => String(Math.round(value * 10) / 10);

const rowsOf = ({ group }: EndPlateModel): number[] =>
  Array.from({ length: group.rows }, (_, row) => (row - (group.rows - 1) / 2) * group.pitch);

/** The plate from the side with the beam, and its face as a view; the load angle, radians, turns its line alone. */
export function geometryOf(m: EndPlateModel, theta: number): DetailGeometry {
  const { thickness, height, section, offset } = m;
  const half = height / 2;
  const upper = section.depth / 2 - offset;
  const lower = upper - section.depth;
  const reach = thickness + 0.6 * section.depth;
  const flange = section.flangeThickness;
  const web = Math.min(m.weldLength, height) / 2;
  const behind = Math.max(m.supportThickness, thickness);
  return {
    outline: box(0, thickness, -half, half),
    holes: [],
    welds: [
      { from: { x: thickness, y: -web }, to: { x: thickness, y: web }, leg: m.weldLeg, bothSides: true },
    ],
    member: [
      { outline: box(thickness, reach, lower, upper), hidden: false },
      { outline: box(thickness, reach, upper - flange, upper), hidden: false },
      { outline: box(thickness, reach, lower, lower + flange), hidden: false },
    ],
    bolts: rowsOf(m).map((y) => ({
      from: { x: thickness, y },
      to: { x: -behind, y },
      diameter: m.bolt.size.d,
    })),
    axis: {
      from: { x: 0, y: 0 },
      to: { x: BEYOND * Math.cos(theta) + thickness, y: Math.max(BEYOND, half) * Math.sin(theta) },
    },
    dimensions: [
      { from: { x: reach, y: lower }, to: { x: reach, y: upper }, text: number(section.depth), offset: -30 },
    ],
    thickness,
    views: [faceView(m, upper, lower)],
  };
}

/** The face of the plate as the support sees it: x across the beam. */
function faceView(m: EndPlateModel, upper: number, lower: number): DetailView {
  const { width, height, crossCentres, section, endDistance, group } = m;
  const half = height / 2;
  const web = section.webThickness / 2;
  const flange = section.width / 2;
  const last = half - endDistance;
  const beside = (from: number, to: number, text: string): Dimension => ({
    from: { x: width / 2, y: from },
    to: { x: width / 2, y: to },
    text,
    offset: -24,
  });
  const dimensions = [
    { from: { x: -width / 2, y: -half }, to: { x: width / 2, y: -half }, text: number(width), offset: -44 },
    {
      from: { x: -crossCentres / 2, y: -half },
      to: { x: crossCentres / 2, y: -half },
      text: number(crossCentres),
      offset: -22,
    },
    beside(-half, -last, number(endDistance)),
  ];
  if (group.rows > 1) {
    const text = group.rows === 2 ? number(group.pitch) : `${group.rows - 1} × ${number(group.pitch)}`;
    dimensions.push(beside(-last, last, text));
  }
  return {
    title: 'Face of the plate',
    parts: [
      { outline: box(-width / 2, width / 2, -half, half), cut: false, hidden: false },
      { outline: box(-web, web, lower, upper), cut: false, hidden: true },
      { outline: box(-flange, flange, upper - section.flangeThickness, upper), cut: false, hidden: true },
      { outline: box(-flange, flange, lower, lower + section.flangeThickness), cut: false, hidden: true },
    ],
    bolts: [],
    holes: rowsOf(m).flatMap((y) =>
      [-crossCentres / 2, crossCentres / 2].map((x) => ({
        centre: { x, y },
        diameter: m.bolt.holeDiameter,
      })),
    ),
    fillets: [],
    dimensions,
  };
}
