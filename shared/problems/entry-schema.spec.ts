import { asTyped, line, optionalLine, paragraphs, webAddress } from '#shared/problems/entry-schema';
import { complaintsOf, readBy } from '#shared/problems/complaints-of';
import type * as z from 'zod';

const codeOf = (schema: z.ZodType, text: string) => {
  const { error } = readBy(schema, text);
  return error && complaintsOf(error)[0]?.code;
};

const texts = { line: line(80), optionalLine: optionalLine(80), paragraphs: paragraphs(80) };

describe.each(Object.entries(texts))('%s', (_, schema) => {
  it.each([
    'a\ud800b',
    '\udc00',
    'a\ud83d',
    '\ude00\ud83d',
    'a\uffffb',
    'a\ufffeb',
    'a\u061cb',
    'a\u200eb',
    'a\u200fb',
  ])('refuses %j', (text) => expect(codeOf(schema, text)).toBe('entry-wrong-form'));

  it.each(['a\ud83d\ude00b', 'Zoë', 'می‌خواهم', 'soft\u00adware', '👩‍🎨'])('takes %j as it is', (text) =>
    expect(schema.parse(text)).toBe(text),
  );
});

describe('A line of signs that are drawn as nothing', () => {
  const undrawn = ['\u200b', '\u00ad', '\u3164', ' \u200b\u00ad ', '\u2060\ufeff', '\u115f\u1160', '\ufe0f', '\u2800'];

  it.each(undrawn)('%j is none', (text) => {
    expect(codeOf(line(80), text)).toBe('entry-missing');
    expect(optionalLine(80).parse(text)).toBe('');
  });
});

it('What is kept as it was typed is refused with half a pair of surrogates, and so is a link', () => {
  expect(codeOf(asTyped(10), '\ud800')).toBe('entry-wrong-form');
  expect(asTyped(10).parse(' 12\u200b ')).toBe(' 12\u200b ');
  expect(codeOf(webAddress, 'https://herons.example/\ud800')).toBe('entry-not-link');
});
