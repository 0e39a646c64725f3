import { canonicalJson } from '#shared/estimates/canonical-json';
import type { Finding } from '#shared/words/finding';

/** Findings that say the same, told once; one that speaks of several things leads to none of them. */
export function distinctFindings(findings: readonly Finding[]): Finding[] {
  const told = new Map<string, Finding>();
  for (const finding of findings) {
    const { about: _about, ...said } = finding;
    const key = canonicalJson(said);
    told.set(key, told.has(key) ? said : finding);
  }
  return [...told.values()];
}
