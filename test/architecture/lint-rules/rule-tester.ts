import { RuleTester } from 'eslint';
import { parser } from 'typescript-eslint';

/** Tries a rule on TypeScript; every case is a test of its own. */
export const ruleTester = new RuleTester({ languageOptions: { parser } });
