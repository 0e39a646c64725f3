export const money = {
} as const;
