/** Exact by definition: the inch of 1959, its square, the grain and the troy ounce (International Yard and Pound Agreement). */
export const millimetresPerInch = 25.4;
export const millimetresPerFoot = 304.8;
export const squareMillimetresPerSquareInch = 645.16;
export const squareMillimetresPerSquareFoot = 92_903.04;
export const gramsPerGrain = 0.064_798_91;
export const gramsPerTroyOunce = 31.103_476_8;

/** Lengths rest as whole nanometres, so that both a tenth of a millimetre and 1/32 in (793,750) are exact. */
export const nanometresPerMillimetre = 1_000_000;
export const nanometresPer32ndInch = 793_750;
