export const jobs = {
} as const;
