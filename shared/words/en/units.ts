export const units = {
} as const;
