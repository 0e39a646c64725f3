/** What a scale drawing needs of a view; the drawings of `shared/measure` fit it as they are. */
export interface ScaleView {
  readonly paths: readonly ScalePath[];
  readonly dimensions: readonly ScaleDimension[];
  readonly box: {
    readonly left_mm: number;
    readonly top_mm: number;
    readonly width_mm: number;
    readonly height_mm: number;
  };
}

/** SVG path data in mm; `cut` is the thin edge of a flute, `gold` is drawn in gold, `leaf`, `pale` and `lap` are filled fields of a lay plan. */
export interface ScalePath {
  readonly kind: 'outline' | 'hidden' | 'opening' | 'axis' | 'cut' | 'gold' | 'leaf' | 'pale' | 'lap';
  readonly data: string;
}

export interface ScalePoint {
  readonly x_mm: number;
  readonly y_mm: number;
}

export interface ScaleDimension {
  readonly from: ScalePoint;
  readonly to: ScalePoint;
  readonly label_mm: number;
  /** What it says, where that is more than the length: “844 mm shown of 2,860”. */
  readonly words?: string;
  readonly side: 'above' | 'below' | 'left' | 'right';
}
