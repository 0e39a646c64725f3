/** A figure as Intl wrote it, with a true minus (U+2212) directly before it instead of the hyphen most locales put there. */
export const trueMinus = (written: string): string => written.replaceAll('-', '−');
