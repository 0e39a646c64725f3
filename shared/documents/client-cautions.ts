import type { Finding } from '#shared/words/finding';

/** Findings that concern whoever owns the piece; those of the bench stay at the bench. */
const told: ReadonlySet<string> = new Set(['drying-moisture-apart', 'drying-joint-moves']);

/** What an estimate is worked under, as far as the client has to know. */
export interface CautionFacts {
  readonly findings: readonly Finding[];
  readonly isRestoration: boolean;
}

const caution = (code: Finding['code']): Finding => ({ kind: 'caution', code, values: {} });

/** What a client has to be warned of: a top on its base, old coatings, wood that will move; and whom to ask. Each said once. */
export function clientCautions({ findings, isRestoration }: CautionFacts): Finding[] {
  const own = findings.filter((finding) => told.has(finding.code));
  const once = [...new Map(own.map((finding) => [JSON.stringify([finding.code, finding.values]), finding])).values()];
  return [
    caution('client-top-on-base'),
    ...(isRestoration ? [caution('client-old-coatings')] : []),
    ...once,
    caution('caution-defer'),
  ];
}
