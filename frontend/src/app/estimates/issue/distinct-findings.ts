import type { Finding } from '#shared/words/finding';
import { gatheredFindings } from '../../drying';

/** A finding with everything it was said of. */
export interface ToldFinding {
  readonly finding: Finding;
  readonly about: readonly string[];
}

/** Findings that say the same, told once with the steps of all; one that speaks of several things leads to none of them. */
export function distinctFindings(findings: readonly Finding[]): ToldFinding[] {
  return gatheredFindings(findings).map(({ finding, about }) => {
    const { about: _first, ...said } = finding;
    return { finding: about.length > 1 ? said : finding, about };
  });
}
