import { canonicalJson } from '#shared/estimates/canonical-json';
import type { Finding } from '#shared/words/finding';

/** A finding with everything it was said of. */
export interface ToldFinding {
  readonly finding: Finding;
  readonly about: readonly string[];
}

/** Findings that say the same, told once; one that speaks of several things leads to none of them. */
export function distinctFindings(findings: readonly Finding[]): ToldFinding[] {
  const told = new Map<string, ToldFinding>();
  for (const finding of findings) {
    const { about, ...said } = finding;
    const key = canonicalJson(said);
    const before = told.get(key);
    const all = [...(before?.about ?? []), ...(about === undefined ? [] : [about])];
    told.set(key, { finding: before ? said : finding, about: all });
  }
  return [...told.values()];
}
