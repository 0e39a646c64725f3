/** A place on a drawing in mm: x to the right, y downwards, as SVG and PDF have them. */
export interface DrawingPoint {
  readonly x_mm: number;
  readonly y_mm: number;
}

/** A stroke of a view: SVG path data in mm, of absolute M, L, A, C and Z only; `cut` is an edge of a flute, reed or groove, `opening` one whose place nobody gave. */
export interface DrawingPath {
  readonly kind: 'outline' | 'hidden' | 'opening' | 'axis' | 'cut';
  readonly data: string;
}

/** A dimension between two places; `side` says where its line stands clear of the figure, `label_mm` what it measures. */
export interface DrawingDimension {
  readonly from: DrawingPoint;
  readonly to: DrawingPoint;
  readonly label_mm: number;
  readonly side: 'above' | 'below' | 'left' | 'right';
}

/** What all paths of a view lie within, dimensions apart. */
export interface DrawingBox {
  readonly left_mm: number;
  readonly top_mm: number;
  readonly width_mm: number;
  readonly height_mm: number;
}

export interface DrawingView {
  readonly view: 'face' | 'profile' | 'plan' | 'elevation' | 'unrolled';
  readonly paths: readonly DrawingPath[];
  readonly dimensions: readonly DrawingDimension[];
  readonly box: DrawingBox;
}

/** A member drawn to scale, one view or several, each in mm of its own. A measured area has none. */
export interface Drawing {
  readonly views: readonly DrawingView[];
}
