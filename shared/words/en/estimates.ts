export const estimates = {
} as const;
