import type { Choice } from '#shared/estimates/draft';

/** A choice as an address carries it: ids with commas between; what is no id is refused later, as not offered. */
export const choiceInAddress = (text: string): Choice => text.split(',').filter((id) => id !== '');
