export const leaf = {
} as const;
