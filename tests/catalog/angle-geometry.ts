/** Area and first moments of a piece: mm2, mm3. */
interface Piece {
  readonly area: number;
  readonly x: number;
  readonly y: number;
}

function rectangle(x: number, y: number, width: number, height: number): Piece {
  return { area: width * height, x: x + width / 2, y: y + height / 2 };
}

/**
 * The sliver between a square corner and the quarter circle of radius r that rounds it.
 * Area (1 - pi/4) r2, centroid r (10 - 3 pi)/(12 - 3 pi) from the corner along each side.
 */
function sliver(x: number, y: number, towardsX: 1 | -1, towardsY: 1 | -1, r: number, sign: 1 | -1): Piece {
  const reach = (r * (10 - 3 * Math.PI)) / (12 - 3 * Math.PI);
  return { area: sign * (1 - Math.PI / 4) * r * r, x: x + towardsX * reach, y: y + towardsY * reach };
}

/** Area and centroid of an angle with its heel at the origin, leg a along y, leg b along x. mm. */
export function angleProperties(a: number, b: number, t: number, rootRadius: number, toeRadius: number) {
  const pieces = [
    rectangle(0, 0, b, t),
    rectangle(0, t, t, a - t),
    sliver(t, t, 1, 1, rootRadius, 1),
    sliver(b, t, -1, -1, toeRadius, -1),
    sliver(t, a, -1, -1, toeRadius, -1),
  ];
  const area = pieces.reduce((sum, piece) => sum + piece.area, 0);
  const cx = pieces.reduce((sum, piece) => sum + piece.area * piece.x, 0) / area;
  const cy = pieces.reduce((sum, piece) => sum + piece.area * piece.y, 0) / area;
  return { area, cx, cy };
}
