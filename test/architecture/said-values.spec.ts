import { catalogueOf } from './catalogue-files';
import { productFiles, textOf } from './project-files';
import { saidValues } from './said-values';

describe('What is said', () => {
  const english = catalogueOf('en');

  it('has every value its message names, wherever the values stand beside the code', () => {
    const said = productFiles().map((file) => ({ file, ...saidValues(textOf(file), english) }));
    expect(said.flatMap(({ file, missing }) => missing.map((text) => `${file} ${text}`))).toEqual([]);
    expect(said.reduce((sum, { count }) => sum + count, 0)).toBeGreaterThan(600);
  });
});

describe('The check of what is said', () => {
  const catalogue = { 'runs-so-far': '{girth} along {run_mm}', plain: 'so it is', other: '{name}' };
  const missingIn = (text: string) => saidValues(text, catalogue).missing;

  it.each([
    ['a value left out', "words.say('runs-so-far', { girth_mm: 3 });", ['line 1: runs-so-far lacks run_mm']],
    ['no values at all', "\nsay('other');", ['line 2: other lacks name']],
    ['a value left out in one case of two', "say(is ? 'plain' : 'other', {});", ['line 1: other lacks name']],
    ['a function that passes them on', "because('other', { nome: 1 }, 2);", ['line 1: other lacks name']],
    ['a finding', "({ kind: 'warn', code: 'other', values: {} });", ['line 1: other lacks name']],
    ['a reason', "({ code: 'other', values: {}, figure: 1, unit: 'mm' });", ['line 1: other lacks name']],
  ])('finds %s', (_, text, complaints) => {
    expect(missingIn(text)).toEqual(complaints);
  });

  it.each([
    ['a value by its name with the unit', "say('runs-so-far', { girth_mm: 3, run_mm: 4 });"],
    ['a value by its bare name', "say('runs-so-far', { girth, run_mm: 4 });"],
    ['a message without values', "say('plain');"],
    ['values from elsewhere', "say('other', values); say('other', { ...values });"],
    ['what may get more on its way', "({ code: 'other', values: {} });"],
    ['what is no message', "open('other-thing', {});"],
  ])('lets pass %s', (_, text) => {
    expect(missingIn(text)).toEqual([]);
  });
});
