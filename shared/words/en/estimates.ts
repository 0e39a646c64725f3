export const estimates = {
  'zone-shares-over': 'The shares of this member come to more than 100 %.',
  'stages-not-whole': 'The stages must come to 100 % together.',
  'zone-leaf-missing': 'Choose the leaf that is laid on {zone}.',
} as const;
