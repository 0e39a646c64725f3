/** What a person does in a workshop; one person may hold several. */
export const roles = ['owner', 'estimator', 'bench', 'office'] as const;
export type Role = (typeof roles)[number];

/** What an answer shows: `cost` everything, `price` prices without cost, `bench` neither, `public` what a stranger may see. */
export const audiences = ['cost', 'price', 'bench', 'public'] as const;
export type Audience = (typeof audiences)[number];

/** The widest view a set of roles is entitled to. */
export function audienceOf(held: readonly Role[]): Audience {
  if (held.includes('owner') || held.includes('estimator')) return 'cost';
  return held.includes('office') ? 'price' : 'bench';
}
