import { wayBack } from './way-back';

describe('wayBack', () => {
  it.each(['/jobs', '/jobs/018f?search=heron%20leg', '/'])('goes where somebody was going: %s', (next) => {
    expect(wayBack(next)).toBe(next);
  });

  it.each([
    ['another site', 'https://elsewhere.example'],
    ['another site without its scheme', '//elsewhere.example'],
    ['another site behind a backslash', '/\\elsewhere.example'],
    ['backslashes later on', '/jobs\\..\\elsewhere'],
    ['a scheme without slashes', 'https:elsewhere.example'],
    ['script', 'javascript:alert(1)'],
    ['a line break', '/jobs\n//elsewhere.example'],
    ['nothing', undefined],
  ])('goes home instead of to %s', (_, next) => {
    expect(wayBack(next)).toBe('/');
  });
});
