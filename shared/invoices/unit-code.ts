/**
 * Units of UN/ECE Recommendation 20 (revision 11e) a workshop bills in, all admitted by rule BR-CL-23 of EN 16931: one, piece, set, hour,
 * minute, day, week, square metre, metre, square and linear foot, litre, kilogram, gram, kilometre, lump sum, booklet of leaf, percent.
 */
export const unitCodes = [
  ...['C62', 'H87', 'EA', 'SET', 'HUR', 'LH', 'MIN', 'DAY', 'WEE', 'MTK', 'MTR', 'CMK', 'FTK', 'FOT'],
  ...['LTR', 'KGM', 'GRM', 'KMT', 'LS', 'D63', 'P1', 'DMQ', 'MTQ'],
] as const;
export type UnitCode = (typeof unitCodes)[number];
