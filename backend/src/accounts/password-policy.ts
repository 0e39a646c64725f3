import { dictionary } from '@zxcvbn-ts/language-common';
import type { Complaint } from '#shared/problems/complaint';
import { Rejection } from '#shared/problems/rejection';
import type { WordCode, WordValues } from '#shared/words/word-code';
import { oftenTriedPhrases } from './often-tried-phrases';

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
const enoughOfOnesOwn = 6;
const productName = 'bolewright';

const plain = (text: string): string =>
  text
    .normalize('NFKC')
    .toLowerCase()
    .replace(/[^\p{L}\p{N}]+/gu, '');

const common = new Set(dictionary['passwords'].map(plain));
const isFigures = (text: string): boolean => /^\d*$/.test(text);
const isOfCommon = (text: string): boolean =>
  isFigures(text) || common.has(text) || common.has(text.replace(/\d+$/, ''));

/** A shorter piece said again and again, the last time perhaps in part. */
function isRepetition(text: string): boolean {
  for (let length = 1; length * 2 <= text.length; length++) {
    const piece = text.slice(0, length);
    if (piece.repeat(Math.ceil(text.length / length)).startsWith(text)) return true;
  }
  return false;
}

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
  oftenTriedPhrases.reduce((rest, phrase) => rest.replaceAll(phrase, ''), text);

/** A common password, and after it figures or another one; figures may also stand before. */
function isBuiltOnCommon(text: string): boolean {
  const begun = text.replace(/^\d+(?=\p{L})/u, '');
  return [text, begun].some((whole) =>
    [...whole].some((_, at) => {
      const rest = whole.slice(at + 1);
      return common.has(whole.slice(0, at + 1)) && isOfCommon(rest);
    }),
  );
}

/** Whether a password is among those tried first: a common one, a row of keys, a saying, or little beside one. */
function isCommon(password: string): boolean {
  const text = plain(password);
  const own = withoutPhrases(withoutRuns(text));
  return (
    isFigures(text) ||
    new Set(own).size < 5 ||
    own.length < enoughOfOnesOwn ||
    isRepetition(text) ||
    isBuiltOnCommon(text)
  );
}

/** Words an attacker thinks of first: the product, the workshop, the person. */
const aboutOf = (context: readonly string[]): string[] =>
  [productName, ...context.flatMap((text) => [text, text.split('@')[0] ?? ''])]
    .map(plain)
    .filter((word) => word.length >= 4);

/** Whether little is left once each word of the workshop's and the person's name is taken out. */
function isMadeOfNames(text: string, context: readonly string[]): boolean {
  const words = context.flatMap((one) => one.split(/[^\p{L}\p{N}]+/u)).map(plain);
  const long = words.filter((word) => word.length >= 4).sort((one, other) => other.length - one.length);
  const rest = long.reduce((left, word) => left.replaceAll(word, ''), text);
  return rest !== text && rest.length < enoughOfOnesOwn;
}

function complaint(code: WordCode, values: WordValues = {}): Rejection {
  const complaints: Complaint[] = [{ path: ['password'], code, values }];
  return new Rejection('invalid', 'problem-invalid', { complaints });
}

/** Refuses a new password that is common or speaks of the product, the workshop or the person (NIST SP 800-63B-4, block lists). */
export function refuseWeakPassword(password: string, context: readonly string[]): void {
  const text = plain(password);
  if (aboutOf(context).some((word) => text.includes(word)) || isMadeOfNames(text, context))
    throw complaint('password-about-you');
  if (isCommon(password)) throw complaint('password-common');
}
