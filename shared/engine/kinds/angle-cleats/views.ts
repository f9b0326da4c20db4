import type { UprightGroup } from '../../limit-states/upright-group.ts';
import type { DetailView, Dimension, Point } from '../../types.ts';
import type { CleatModel } from './model.ts';

export const box = (x0: number, x1: number, y0: number, y1: number): Point[] => [
  { x: x0, y: y0 },
  { x: x1, y: y0 },
  { x: x1, y: y1 },
  { x: x0, y: y1 },
];

export const number = (value: number): string => String(Math.round(value * 10) / 10);

/** Heights of the rows of a group about its middle, mm. */
export const rowsOf = ({ rows, pitch }: UprightGroup): number[] =>
  Array.from({ length: rows }, (_, row) => (row - (rows - 1) / 2) * pitch);

/** Sides of the web that have a cleat. */
const sidesOf = (m: CleatModel): readonly (1 | -1)[] => (m.legs.cleats === 2 ? [1, -1] : [1]);

/** The detail cut level through a row of bolts: x from the face of the support, y across the web, mm. */
export function planView(m: CleatModel, reach: number, behind: number): DetailView {
  const { legs, beam, bolts, weld, group } = m;
  const half = beam.web.thickness / 2;
  const flange = beam.section.width / 2;
  const { thickness: t, webLeg, outstandingLeg } = legs;
  const angle = (side: 1 | -1): Point[] =>
    [
      [0, half],
      [webLeg, half],
      [webLeg, half + t],
      [t, half + t],
      [t, half + outstandingLeg],
      [0, half + outstandingLeg],
    ].map(([x = 0, y = 0]) => ({ x, y: side * y }));
  const far = half + (legs.cleats === 2 ? t : 0);
  return {
    title: 'Section through the bolts',
    parts: [
      ...sidesOf(m).map((side) => ({ outline: angle(side), cut: true, hidden: false })),
      { outline: box(beam.gap, reach, -half, half), cut: true, hidden: false },
      { outline: box(beam.gap + beam.bottom.length, reach, -flange, flange), cut: false, hidden: true },
    ],
    bolts: [
      ...Array.from({ length: group.columns }, (_, column) => {
        const x = legs.firstColumn + column * group.gauge;
        return { from: { x, y: half + t }, to: { x, y: -far }, diameter: m.bolt.size.d };
      }),
      ...(bolts === null ? [] : sidesOf(m)).map((side) => {
        const y = side * (half + (bolts?.backmark ?? 0));
        return { from: { x: t, y }, to: { x: -behind, y }, diameter: bolts?.bolt.size.d ?? 0 };
      }),
    ],
    fillets: (weld === null ? [] : sidesOf(m)).map((side) => {
      const toe = half + outstandingLeg;
      const leg = weld?.leg ?? 0;
      return [
        { x: 0, y: side * toe },
        { x: leg, y: side * toe },
        { x: 0, y: side * (toe + leg) },
      ] as const;
    }),
    dimensions: [
      {
        from: { x: webLeg, y: half },
        to: { x: webLeg, y: half + t },
        text: `t ${number(t)}`,
        offset: -2.5 * t,
      },
    ],
  };
}

/** The outstanding legs as the support sees them: x across the web. */
export function faceView(m: CleatModel): DetailView {
  const { legs, beam, bolts } = m;
  const half = beam.web.thickness / 2;
  const high = m.height / 2;
  const sides = sidesOf(m);
  const heights = bolts === null ? [] : rowsOf(bolts.group);
  const at = (bolts?.backmark ?? 0) + half;
  return {
    title: 'Outstanding legs',
    parts: [
      ...sides.map((side) => ({
        outline: box(side * half, side * (half + legs.outstandingLeg), -high, high),
        cut: false,
        hidden: false,
      })),
      { outline: box(-half, half, -high, high), cut: false, hidden: true },
    ],
    bolts: [],
    holes: heights.flatMap((y) =>
      sides.map((side) => ({ centre: { x: side * at, y }, diameter: bolts?.bolt.holeDiameter ?? 0 })),
    ),
    fillets: [],
    dimensions: dimensionsOf(m),
  };
}

function dimensionsOf(m: CleatModel): Dimension[] {
  const { legs, beam, bolts } = m;
  if (bolts === null) return [];
  const half = beam.web.thickness / 2;
  const high = m.height / 2;
  const at = half + bolts.backmark;
  const toe = half + legs.outstandingLeg;
  const level = (from: number, to: number): Dimension => ({
    from: { x: from, y: -high },
    to: { x: to, y: -high },
    text: number(to - from),
    offset: -22,
  });
  const beside = (from: number, to: number, text: string): Dimension => ({
    from: { x: toe, y: from },
    to: { x: toe, y: to },
    text,
    offset: -24,
  });
  const { rows, pitch } = bolts.group;
  const lowest = -high + bolts.endDistance;
  const dimensions = [
    legs.cleats === 2 ? level(-at, at) : level(half, at),
    beside(-high, lowest, number(bolts.endDistance)),
  ];
  if (rows > 1) {
    const text = rows === 2 ? number(pitch) : `${rows - 1} × ${number(pitch)}`;
    dimensions.push(beside(lowest, high - bolts.endDistance, text));
  }
  return dimensions;
}
