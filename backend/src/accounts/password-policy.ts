import { dictionary } from '@zxcvbn-ts/language-common';
import type { Complaint } from '#shared/problems/complaint';
import { Rejection } from '#shared/problems/rejection';
import type { WordCode, WordValues } from '#shared/words/word-code';
import { commonPhrases } from './common-phrases';

const common = new Set(dictionary['passwords']);
const rows = [
  'abcdefghijklmnopqrstuvwxyz',
  '01234567890',
  'qwertyuiop',
  'qwertzuiop',
  'azertyuiop',
  'asdfghjkl',
  'zxcvbnm',
  'yxcvbnm',
];
const enoughOfOnesOwn = 8;
const productName = 'bolewright';

const plain = (text: string): string =>
  text
    .normalize('NFKC')
    .toLowerCase()
    .replace(/[^\p{L}\p{N}]+/gu, '');

/** A shorter piece said again and again. */
const isRepetition = (text: string): boolean =>
  /^(.{1,8}?)\1+.{0,7}$/su.test(text) && new Set(text).size <= enoughOfOnesOwn;

/** Takes out runs of four and more along the alphabet, the figures or a keyboard, in either direction. */
function withoutRuns(text: string): string {
  let rest = text;
  for (const row of rows.flatMap((one) => [one, [...one].reverse().join('')])) {
    for (let length = row.length; length >= 4; length--) {
      for (let at = 0; at + length <= row.length; at++) rest = rest.replaceAll(row.slice(at, at + length), '');
    }
  }
  return rest;
}

const withoutPhrases = (text: string): string =>
  commonPhrases.reduce((rest, phrase) => rest.replaceAll(phrase, ''), text);

/** Made of two common passwords, with or without figures around them. */
function isPairOfCommon(text: string): boolean {
  const letters = text.replace(/^\d+|\d+$/g, '');
  if (common.has(text) || common.has(letters)) return true;
  return [...letters].some((_, at) => at > 0 && common.has(letters.slice(0, at)) && common.has(letters.slice(at)));
}

/** Whether a password is among those tried first: a common one, a row of keys, a saying, or little beside one. */
function isCommon(password: string): boolean {
  const text = plain(password);
  const own = withoutPhrases(withoutRuns(text));
  return new Set(own).size < 5 || own.length < enoughOfOnesOwn || isRepetition(text) || isPairOfCommon(text);
}

/** Words an attacker thinks of first: the product, the workshop, the person. */
const aboutOf = (context: readonly string[]): string[] =>
  [productName, ...context.flatMap((text) => [text, text.split('@')[0] ?? ''])]
    .map(plain)
    .filter((word) => word.length >= 4);

function complaint(code: WordCode, values: WordValues = {}): Rejection {
  const complaints: Complaint[] = [{ path: ['password'], code, values }];
  return new Rejection('invalid', 'problem-invalid', { complaints });
}

/** Refuses a new password that is common or speaks of the product, the workshop or the person (NIST SP 800-63B-4, block lists). */
export function refuseWeakPassword(password: string, context: readonly string[]): void {
  const text = plain(password);
  if (aboutOf(context).some((word) => text.includes(word))) throw complaint('password-about-you');
  if (isCommon(password)) throw complaint('password-common');
}
