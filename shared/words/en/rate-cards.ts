export const rateCards = {
} as const;
