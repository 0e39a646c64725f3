/** Which ends of a shape are covered too; none unless chosen. */
export interface Ends {
  readonly top: boolean;
  readonly bottom: boolean;
}

export const noEnds: Ends = { top: false, bottom: false };
