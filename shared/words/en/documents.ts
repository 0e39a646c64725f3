export const documents = {
} as const;
