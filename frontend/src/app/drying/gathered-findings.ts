import type { Finding } from '#shared/words/finding';

/** A finding told once, with everything it speaks of. */
export interface GatheredFinding {
  readonly finding: Finding;
  readonly about: readonly string[];
}

const listed = (one: Finding['values'][string], other: Finding['values'][string]): string =>
  [...new Set([...String(one).split(', '), ...String(other).split(', ')])].join(', ');

/** Two of one code as one: the steps of both. */
const merged = (one: Finding, other: Finding): Finding =>
  'steps' in one.values && 'steps' in other.values
    ? { ...one, values: { ...one.values, steps: listed(one.values['steps'], other.values['steps']) } }
    : one;

const keyOf = ({ code, values }: Finding): string => {
  const { steps: _steps, ...others } = values;
  return `${code} ${JSON.stringify(others)}`;
};

/** Findings that say the same of several things, said once with the steps of all; whom to ask comes last. */
export function gatheredFindings(findings: readonly Finding[]): GatheredFinding[] {
  const gathered = new Map<string, GatheredFinding>();
  for (const finding of findings) {
    const known = gathered.get(keyOf(finding));
    const about = [...new Set([...(known?.about ?? []), ...(finding.about ? [finding.about] : [])])];
    gathered.set(keyOf(finding), { finding: known ? merged(known.finding, finding) : finding, about });
  }
  const all = [...gathered.values()];
  const isLast = ({ finding }: GatheredFinding) => finding.code === 'caution-defer';
  return [...all.filter((one) => !isLast(one)), ...all.filter(isLast)];
}
