/** The paper a workshop prints on. */
export const paperSizes = ['A4', 'Letter'] as const;
export type PaperSize = (typeof paperSizes)[number];

/** Tax categories of invoices, by their codes in UNCL 5305 as EN 16931 restricts it (BR-CL-17). */
export const taxCategories = ['S', 'Z', 'E', 'AE', 'K', 'G', 'O', 'L', 'M', 'B'] as const;
export type TaxCategory = (typeof taxCategories)[number];
