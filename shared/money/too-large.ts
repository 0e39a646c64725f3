/** A figure or a count beyond what is worked here: each entry is possible by itself, together they are not. */
export class TooLarge extends RangeError {
  override readonly name = 'TooLarge';
}

/** What some work comes to, or undefined where a figure of it becomes too large; other errors are passed on. */
export function unlessTooLarge<Outcome>(work: () => Outcome): Outcome | undefined {
  try {
    return work();
  } catch (error) {
    if (error instanceof TooLarge) return undefined;
    throw error;
  }
}
