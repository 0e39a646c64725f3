import type { StageClaim } from '#shared/invoices/stage-claim';

/** Whether a claim waits for something that is reached one day: a deposit falls due on acceptance, and what is credited, or claimed again, at any time. */
export const mayBeReached = ({ claim, gross_minor }: { claim: StageClaim; gross_minor: number }): boolean =>
  gross_minor > 0 && claim.of !== 'deposit' && claim.of !== 'again';
