import { complain } from '#shared/problems/complaints-of';
import { asTyped } from '#shared/problems/entry-schema';

/** NIST SP 800-63B-4: at least 15 characters where there is no second factor; nobody needs more than 128. */
export const passwordLength = { minimum: 15, maximum: 128 } as const;

/** One Unicode code point is one character; text is normalised first (NFKC), so that one keyboard writes what another reads. */
const characters = (password: string): number => [...password.normalize('NFKC')].length;

/** A password somebody signs in with: whatever they type, within bounds. */
export const enteredPassword = asTyped(1_024).min(1);

/** A password somebody chooses: only its length is asked here, the server refuses common ones. Spaces count, also at the end. */
export const chosenPassword = enteredPassword
  .refine(
    (text) => characters(text) >= passwordLength.minimum,
    complain('entry-too-short', { minimum: passwordLength.minimum }),
  )
  .refine(
    (text) => characters(text) <= passwordLength.maximum,
    complain('entry-too-long', { maximum: passwordLength.maximum }),
  );
