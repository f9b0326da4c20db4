import type { DetailView, Point } from '../../types.ts';
import type { FinPlateModel } from './model.ts';

const box = (x0: number, x1: number, y0: number, y1: number): Point[] => [
  { x: x0, y: y0 },
  { x: x1, y: y0 },
  { x: x1, y: y1 },
  { x: x0, y: y1 },
];

/** The detail cut level through a row of bolts: x from the face of the support, y across the plate, mm. */
export function planView(m: FinPlateModel, reach: number): DetailView {
  const half = m.thickness / 2;
  const web = m.beam.web.thickness;
  const middle = half + web / 2;
  const flange = m.beam.section.width / 2;
  const { columns, gauge } = m.group;
  return {
    title: 'Section through the bolts',
    parts: [
      { outline: box(0, m.width, -half, half), cut: true, hidden: false },
      { outline: box(m.beam.gap, reach, half, half + web), cut: true, hidden: false },
      {
        outline: box(m.beam.gap + m.beam.bottom.length, reach, middle - flange, middle + flange),
        cut: false,
        hidden: true,
      },
    ],
    bolts: Array.from({ length: columns }, (_, column) => {
      const x = m.firstColumn + column * gauge;
      return { from: { x, y: half + web }, to: { x, y: -half }, diameter: m.bolt.size.d };
    }),
    fillets: ([1, -1] as const).map(
      (side) =>
        [
          { x: 0, y: side * half },
          { x: m.weldLeg, y: side * half },
          { x: 0, y: side * (half + m.weldLeg) },
        ] as const,
    ),
    dimensions: [
      {
        from: { x: 0, y: -half },
        to: { x: 0, y: half },
        text: `t ${Math.round(m.thickness * 10) / 10}`,
        offset: 2.5 * m.weldLeg,
      },
    ],
  };
}
