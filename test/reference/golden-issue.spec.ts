import { calculatorVersion } from '#shared/estimates/calculator-version';
import { goldenIssue } from './golden-issue';
import { goldenTotals } from './golden-totals';

// Source: own. The file holds what one issue froze and what it came to; a change of any total means another calculator version.
describe('The golden issue', () => {
  const { input, worked, calculatorVersion: version } = goldenIssue();

  it('was worked by the calculator of this version', () => {
    expect(version).toBe(calculatorVersion);
  });

  it('comes to the same totals, to the cent, for the base and for every alternative', () => {
    expect(worked.length).toBeGreaterThan(1);
    expect(goldenTotals(input)).toEqual(worked);
  });
});
