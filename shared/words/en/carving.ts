export const carving = {
} as const;
