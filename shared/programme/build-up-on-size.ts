import type { BuildUp } from '#shared/buildups/buildup';

/**
 * A build-up laid on the size of another, under an id of its own: everything of its size step but the id, which other steps name, is the other's. Null where
 * either is laid on no size.
 */
export function buildUpOnSize(own: BuildUp, other: BuildUp): BuildUp | null {
  const size = other.steps.find(({ kind }) => kind === 'oil-size');
  if (!size || !own.steps.some(({ kind }) => kind === 'oil-size')) return null;
  const steps = own.steps.map((step) => (step.kind === 'oil-size' ? { ...size, id: step.id } : step));
  return { ...own, id: `${own.id}~${other.id}`, steps };
}
