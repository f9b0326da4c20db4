import type { DetailView, Point } from '../../types.ts';
import type { GussetModel } from './model.ts';

const box = (x0: number, x1: number, y0: number, y1: number): Point[] => [
  { x: x0, y: y0 },
  { x: x1, y: y0 },
  { x: x1, y: y1 },
  { x: x0, y: y1 },
];

/** The detail cut along the line of the brace: x from the weld line along the brace, y across the plate, mm. */
export function sectionView(m: GussetModel, reach: number): DetailView {
  const half = m.thickness / 2;
  const plateEnd = m.tapered ? m.cutDistance : Math.max(m.projection, m.lastRow);
  const sides: readonly (1 | -1)[] = m.member.parts === 2 ? [1, -1] : [1];
  const from = m.firstRow - m.member.endDistance;
  const { thickness } = m.member;
  const legs = sides.map((side) => ({
    outline: box(from, reach, side * half, side * (half + thickness)),
    cut: true,
    hidden: false,
  }));
  const standing = m.member.section.shape === 'angle' ? sides : [];
  const outstanding = standing.map((side) => ({
    outline: box(from, reach, side * (half + thickness), side * (half + m.member.otherLeg)),
    cut: false,
    hidden: false,
  }));
  return {
    title: 'Section along the brace',
    parts: [{ outline: box(0, plateEnd, -half, half), cut: true, hidden: false }, ...legs, ...outstanding],
    bolts: Array.from({ length: m.rows }, (_, row) => {
      const x = m.firstRow + row * m.pitch;
      const far = half + thickness;
      return {
        from: { x, y: far },
        to: { x, y: m.member.parts === 2 ? -far : -half },
        diameter: m.bolt.size.d,
      };
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
