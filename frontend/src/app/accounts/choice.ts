/** One line of a select: what is kept and how it reads. */
export interface Choice {
  readonly value: string;
  readonly label: string;
}

/** In the order in which somebody looks for them. */
export const inOrder = (choices: readonly Choice[]): readonly Choice[] =>
  [...choices].sort((one, other) => one.label.localeCompare(other.label));
