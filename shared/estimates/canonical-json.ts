const sorted = (value: unknown): unknown => {
  if (Array.isArray(value)) return value.map(sorted);
  if (value === null || typeof value !== 'object') return value;
  const entries = Object.entries(value).filter(([, inner]) => inner !== undefined);
  return Object.fromEntries(
    entries.sort(([one], [other]) => (one < other ? -1 : 1)).map(([key, inner]) => [key, sorted(inner)]),
  );
};

/** JSON with the keys of every object in order and nothing undefined: equal content is equal text, whoever wrote it. */
export const canonicalJson = (value: unknown): string => JSON.stringify(sorted(value));
