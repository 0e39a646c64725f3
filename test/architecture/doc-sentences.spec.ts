import { isSpec, isTypeScript, projectFiles } from './project-files';
import { publicExports } from './public-exports';

const isSentence = (text: string): boolean => /^\S+ .{12,}[.?!]$/su.test(text.trim());

const functionsOfShared = projectFiles(['shared'], (file) => isTypeScript(file) && !isSpec(file)).flatMap((file) =>
  publicExports(file)
    .filter(({ isFunction }) => isFunction)
    .map(({ name, comment }) => ({ at: `${file}: ${name}`, comment })),
);

describe('A public function of shared', () => {
  it('carries a sentence that says what it gives, in which units', () => {
    expect(functionsOfShared.length).toBeGreaterThan(0);
    expect(functionsOfShared.filter(({ comment }) => !isSentence(comment)).map(({ at }) => at)).toEqual([]);
  });
});

describe('The check of sentences', () => {
  it.each([
    ['Whole leaves for an area in mm², from the leaf side in mm.', true],
    ['', false],
    ['leaves', false],
    ['Whole leaves for an area without an end', false],
  ])('%j is a sentence: %s', (text, is) => {
    expect(isSentence(text)).toBe(is);
  });
});
