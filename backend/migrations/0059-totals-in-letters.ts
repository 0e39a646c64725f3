import { migration } from '../src/platform/database/migration';

/** The total of a letter says by itself whether it is with tax: words a workshop kept for itself need not say it once more. */
export const totalsInLetters = migration('0059-totals-in-letters', [
  `UPDATE letter_templates SET text = REPLACE(text, '{total} with tax', '{total}'), subject = REPLACE(subject, '{total} with tax', '{total}')`,
]);
