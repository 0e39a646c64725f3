export const drying = {
} as const;
