export const measure = {
} as const;
