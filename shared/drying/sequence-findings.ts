import type { DryingCard } from '#shared/drying/drying-card';
import type { SequenceStep } from '#shared/drying/sequence-step';
import type { Finding } from '#shared/words/finding';

/** What to know about the steps of a lot: which wait for somebody, and what the trade does when a window was missed. */
export function sequenceFindings(steps: readonly SequenceStep[], about: string, card: DryingCard): Finding[] {
  const holds = steps.flatMap(({ holds: waits, name }) =>
    waits.map((hold): Finding => ({
      kind: 'note',
      code: `drying-hold-${hold}`,
      values: { step: name, days: card.holds_days[hold] },
      about,
    })),
  );
  const missed = new Set(steps.flatMap((step) => (step.missed ? [step.missed] : [])));
  return [
    ...holds,
    ...[...missed].map((name): Finding => ({ kind: 'note', code: `drying-missed-${name}`, values: {}, about })),
  ];
}
