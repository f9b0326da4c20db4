import type { DetailGeometry, Point } from '../../types.ts';
import type { GussetModel } from './model.ts';
import { sectionView } from './section-view.ts';

/** Length of the brace that is drawn beyond its last row, mm per mm of its width. */
const STUB = 1.2;

/** Turns positions along and across the brace into x and y. */
function placer(m: GussetModel, theta: number): (s: number, q: number) => Point {
  const cos = Math.cos(theta);
  const sin = Math.sin(theta);
  return (s, q) => ({ x: s * cos - q * sin, y: m.offset + s * sin + q * cos });
}

/** The plate's outline from the lower end of the weld, anticlockwise. */
export function outlineOf(m: GussetModel, theta: number): readonly Point[] {
  const { halfHeight, projection, cutDistance, cutHalfWidth } = m;
  const place = placer(m, theta);
  const far = m.tapered
    ? [place(cutDistance, -cutHalfWidth), place(cutDistance, cutHalfWidth)]
    : [
        { x: projection, y: -halfHeight },
        { x: projection, y: halfHeight },
      ];
  return [{ x: 0, y: -halfHeight }, ...far, { x: 0, y: halfHeight }];
}

/** Outlines, holes, weld and dimensions at a load angle, radians. */
export function geometryOf(m: GussetModel, theta: number): DetailGeometry {
  const place = placer(m, theta);
  const { halfHeight, weldLeg } = m;
  const reach = m.lastRow + STUB * 2 * m.member.halfWidth;
  return {
    outline: outlineOf(m, theta),
    holes: holesOf(m, place),
    welds: [
      {
        from: { x: 0, y: -halfHeight },
        to: { x: 0, y: halfHeight },
        leg: weldLeg,
        bothSides: true,
      },
    ],
    member: memberOf(m, place, reach),
    axis: { from: place(0, 0), to: place(reach + 20, 0) },
    dimensions: dimensionsOf(m, place),
    thickness: m.thickness,
    views: [sectionView(m, reach)],
  };
}

function holesOf(m: GussetModel, place: (s: number, q: number) => Point): DetailGeometry['holes'] {
  const across = m.lines === 2 ? [-m.halfGauge, m.halfGauge] : [0];
  return Array.from({ length: m.rows }, (_, row) =>
    across.map((q) => ({ centre: place(m.firstRow + row * m.pitch, q), diameter: m.bolt.holeDiameter })),
  ).flat();
}

/** Each part as a rectangle from its end to a stub, heel below the axis; the part behind the plate is hidden. */
function memberOf(
  m: GussetModel,
  place: (s: number, q: number) => Point,
  reach: number,
): DetailGeometry['member'] {
  const { member } = m;
  const from = m.firstRow - member.endDistance;
  const half = ((member.linesEach - 1) * m.gauge) / 2;
  const part = (low: number, high: number, hidden: boolean) => ({
    outline: [place(from, low), place(reach, low), place(reach, high), place(from, high)],
    hidden,
  });
  const heel = -(half + member.backmark);
  const toe = half + member.toeDistance;
  switch (member.brace) {
    case 'back_to_back':
      return [part(heel, toe, true), part(heel, toe, false)];
    case 'star': {
      const line = m.halfGauge;
      const below = part(-line - member.toeDistance, -line + member.backmark, true);
      return [below, part(line - member.backmark, line + member.toeDistance, false)];
    }
    case 'single':
    case 'flat':
      return [part(heel, toe, false)];
  }
}

/** Dimension lines along the brace stand this far beside it, mm of drawing. */
const BESIDE = 28;

function dimensionsOf(m: GussetModel, place: (s: number, q: number) => Point): DetailGeometry['dimensions'] {
  const { halfHeight, halfGauge, firstRow, lastRow } = m;
  const side = -(m.member.halfWidth + BESIDE);
  const along = (from: number, to: number, text: string, offset: number) => ({
    from: place(from, -halfGauge),
    to: place(to, -halfGauge),
    text,
    offset,
  });
  const dimensions = [
    { from: { x: 0, y: -halfHeight }, to: { x: 0, y: halfHeight }, text: number(m.weldLength), offset: 30 },
    along(0, firstRow, number(firstRow), side),
  ];
  if (m.rows > 1) {
    const text = m.rows === 2 ? number(m.pitch) : `${m.rows - 1} × ${number(m.pitch)}`;
    dimensions.push(along(firstRow, lastRow, text, side));
  }
  if (m.tapered) {
    dimensions.push(along(lastRow, m.cutDistance, number(m.cutDistance - lastRow), side));
  } else {
    const low = -halfHeight;
    const text = number(m.projection);
    dimensions.push({ from: { x: 0, y: low }, to: { x: m.projection, y: low }, text, offset: -30 });
  }
  if (m.lines === 2) {
    const from = place(lastRow, -halfGauge);
    dimensions.push({ from, to: place(lastRow, halfGauge), text: number(m.gauge), offset: -40 });
  }
  if (m.offset !== 0) {
    const to = place(0, 0);
    dimensions.push({ from: { x: 0, y: 0 }, to, text: number(m.offset), offset: 60 });
  }
  return dimensions;
}

function number(value: number): string {
  return String(Math.round(value * 10) / 10);
}
