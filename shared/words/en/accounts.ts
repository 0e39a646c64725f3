export const accounts = {
} as const;
