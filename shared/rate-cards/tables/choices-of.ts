import type { CardChoice } from '#shared/rate-cards/tables/card-table';

interface Choice<Set extends string, Value extends string> {
  readonly value: Value;
  readonly word: `card-${Set}-${Lowercase<Value>}`;
}

/** Every value of a set with its word; the compiler refuses a value that has none. */
export function choicesOf<Set extends string, const Values extends readonly string[]>(
  set: Set,
  values: Values,
): readonly Choice<Set, Values[number]>[] {
  return values.map((value: Values[number]) => ({
    value,
    word: `card-${set}-${value.toLowerCase() as Lowercase<Values[number]>}` as const,
  }));
}

/** Yes and no as choices. */
export const yesOrNoChoices: readonly CardChoice[] = [
  { value: 'yes', word: 'card-yes' },
  { value: 'no', word: 'card-no' },
];
