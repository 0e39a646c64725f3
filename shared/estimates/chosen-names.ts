import type { Choice } from '#shared/estimates/draft';
import type { Alternative } from '#shared/estimates/settings';

/** What the alternatives of a choice are called, in the order they are offered; none for the base, nothing for one that is not offered. */
export const chosenNames = (offered: readonly Pick<Alternative, 'id' | 'name'>[], choice: Choice): string[] =>
  offered.filter(({ id }) => choice.includes(id)).map(({ name }) => name);
