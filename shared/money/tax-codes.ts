/** Codes of tax categories as EN 16931 admits them (UNCL 5305, its rule BR-CL-17). */
export const taxCodes = ['S', 'Z', 'E', 'AE', 'K', 'G', 'O', 'L', 'M', 'B'] as const;
export type TaxCode = (typeof taxCodes)[number];

/** Categories that have to say why nothing is charged (EN 16931, BR-E-10, BR-AE-10, BR-IC-10, BR-G-10, BR-O-10). */
export const explainedCodes: readonly TaxCode[] = ['E', 'AE', 'K', 'G', 'O'];
