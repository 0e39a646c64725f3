import { dictionary } from '@zxcvbn-ts/language-common';
import type { Rejection } from '#shared/problems/rejection';
import { refuseWeakPassword } from './password-policy';

const context = ['jonah.pikesley@harbourlane.example', 'Jonah Pikesley', 'Harbour Lane Carvers'];

function refusal(password: string): string | undefined {
  try {
    refuseWeakPassword(password, context);
    return undefined;
  } catch (error) {
    return (error as Rejection).more.complaints?.[0]?.code;
  }
}

test.each([
  'passwordpassword',
  'Password123456789',
  'password1password',
  'qwertyuiopasdfgh',
  'qwertyqwertyqwerty',
  '123456789012345',
  '111111111111111',
  'abcdefghijklmno',
  'abcabcabcabcabc',
  'aaaaaaaaaaaaaaaa',
  'iloveyouiloveyou',
  'correct horse battery staple',
  'CorrectHorseBatteryStaple1',
  'letmeinletmeinletmein',
  'dragonmonkey12345678',
  '!!! football 2026 !!!',
  'to be or not to be',
  'ZXCVBNMasdfghjkl',
])('“%s” is among the first that are tried', (password) => {
  expect(refusal(password)).toBe('password-common');
});

test('every common password of fifteen characters and more is refused', () => {
  const long = dictionary['passwords'].filter((word) => word.length >= 15);
  expect(long.length).toBeGreaterThan(5);
  expect(long.filter((word) => refusal(word) === undefined)).toEqual([]);
});

test('every common password written twice, or with figures to make up the length, is refused', () => {
  const tried = dictionary['passwords']
    .slice(0, 3_000)
    .flatMap((word) => [word.repeat(4).slice(0, Math.max(15, word.length * 2)), `${word}2026`.padEnd(15, '0')]);
  expect(tried.filter((word) => refusal(word) === undefined)).toEqual([]);
});

test.each([
  'bolewright forever',
  'Harbour Lane Carvers!',
  'harbourlanecarvers2026',
  'jonah.pikesley is here',
  'I am Jonah Pikesley',
  'Carvers of Harbour Lane',
  'HarbourCarvers 2026',
])('“%s” speaks of product, workshop or person', (password) => {
  expect(refusal(password)).toBe('password-about-you');
});

test.each([
  'seven grey herons wade',
  'nine slow otters swim',
  'damson kettle under the stairs',
  'träge Füchse im Moor',
  '鳥が池のそばで静かに待っている朝',
  'x7#kQ2!vLp9$wTz4',
])('“%s” is one’s own', (password) => {
  expect(refusal(password)).toBeUndefined();
});
