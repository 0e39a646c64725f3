/** What is counted: failed sign-ins; and what clients ask for, whose every time counts, by who it is about and by where it comes from. */
export type LoginScope =
  'pair' | 'address' | 'account' | 'link' | 'letter' | 'letter-address' | 'question' | 'question-address';

/** Failed sign-ins of one scope, and when the last was. */
export interface LoginCount {
  readonly failures: number;
  readonly lastAt: Date;
}

/** How many failures are free, before waits of 1, 2, 4 … seconds begin. */
const free: Readonly<Record<LoginScope, number>> = {
  ...{ pair: 5, address: 30, account: 60, link: 10 },
  ...{ letter: 5, 'letter-address': 30, question: 12, 'question-address': 60 },
};
const longestWait_milliseconds = 15 * 60_000;

/** Failures are remembered for an hour after the last one. */
const memory_milliseconds = 60 * 60_000;

const isForgotten = ({ lastAt }: LoginCount, now: Date): boolean =>
  now.getTime() - lastAt.getTime() > memory_milliseconds;

function wait_milliseconds(scope: LoginScope, failures: number): number {
  const over = failures - free[scope];
  return over < 0 ? 0 : Math.min(1_000 * 2 ** Math.min(over, 20), longestWait_milliseconds);
}

/** How many milliseconds a scope has to wait from now on; 0 where it may try. */
function leftToWait_milliseconds(scope: LoginScope, count: LoginCount, now: Date): number {
  const wait = isForgotten(count, now) ? 0 : wait_milliseconds(scope, count.failures);
  return wait === 0 ? 0 : Math.max(0, count.lastAt.getTime() + wait - now.getTime());
}

/** The failures of a scope with one more attempt. */
const failuresWith = (count: LoginCount, now: Date): number => (isForgotten(count, now) ? 1 : count.failures + 1);

/** How long failed sign-ins make the next one wait. */
export const loginThrottlePolicy = { memory_milliseconds, leftToWait_milliseconds, failuresWith } as const;
