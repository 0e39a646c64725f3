import { languageFor, languages } from './languages';

describe('languageFor', () => {
  it('takes the first language there are words for, whatever its country', () => {
    expect(languageFor(['xx', 'en-IE', 'de'])).toBe('en');
  });

  it('falls back to English', () => {
    expect(languageFor([])).toBe('en');
    expect(languageFor(['constructor'])).toBe('en');
  });

  it('leads to words', async () => {
    const words = await languages['en'].catalogue();
    expect(words['entry-missing']).toBe('Please fill this in.');
  });
});
