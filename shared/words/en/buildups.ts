export const buildups = {
} as const;
