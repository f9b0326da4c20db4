/** Geometry in the plane of the plate: x away from the support's face, y along it, millimetres. */
export interface Point {
  readonly x: number;
  readonly y: number;
}
export interface Dimension {
  readonly from: Point;
  readonly to: Point;
  readonly text: string;
  /** Signed distance of the dimension line from the measured line, mm of drawing. */
  readonly offset: number;
}

/** A section or plan beside the elevation, in axes of its own, mm. */
export interface DetailView {
  readonly title: string;
  /** Cut parts are hatched, hidden ones dashed. */
  readonly parts: readonly {
    readonly outline: readonly Point[];
    readonly cut: boolean;
    readonly hidden: boolean;
  }[];
  /** Shanks by their axes, from head to nut. */
  readonly bolts: readonly { readonly from: Point; readonly to: Point; readonly diameter: number }[];
  /** Holes seen on their faces. */
  readonly holes?: readonly { readonly centre: Point; readonly diameter: number }[];
  /** Cross-sections of fillets: root first, then the two toes. */
  readonly fillets: readonly (readonly [Point, Point, Point])[];
  readonly dimensions: readonly Dimension[];
}

export interface DetailGeometry {
  readonly outline: readonly Point[];
  readonly holes: readonly { readonly centre: Point; readonly diameter: number }[];
  readonly welds: readonly {
    readonly from: Point;
    readonly to: Point;
    readonly leg: number;
    readonly bothSides: boolean;
  }[];
  /** Bolts seen from the side, from head to nut. */
  readonly bolts?: DetailView['bolts'];
  /** Outlines of the connected member's parts in this view, nearest last. */
  readonly member: readonly { readonly outline: readonly Point[]; readonly hidden: boolean }[];
  readonly axis: { readonly from: Point; readonly to: Point };
  readonly dimensions: readonly Dimension[];
  readonly thickness: number;
  /** Sections and plans beside the elevation. */
  readonly views?: readonly DetailView[];
}
