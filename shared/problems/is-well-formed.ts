const halfOfPair = /\p{Surrogate}/u;

/** Whether a text is Unicode through and through: half a pair of surrogates is no letter, and nothing that is kept can hold it. */
export const isWellFormed = (text: string): boolean => !halfOfPair.test(text);
