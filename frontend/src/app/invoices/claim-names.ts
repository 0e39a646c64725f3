import type { StageClaim } from '#shared/invoices/stage-claim';
import type { Formats } from '../core/formats/formats';

/** What a claim on a contract is called. */
export function claimName(
  { claim, name, gross_minor }: { claim: StageClaim; name: string; gross_minor: number },
  formats: Formats,
): string {
  switch (claim.of) {
    case 'deposit':
      return $localize`Deposit`;
    case 'first-release':
      return $localize`First half of what was held back`;
    case 'second-release':
      return $localize`Second half of what was held back`;
    case 'again':
      return $localize`Again, what was credited of ${name}:number:`;
    case 'work':
      if (gross_minor < 0) return $localize`Taken away, to be credited`;
      if (name) return name;
      return $localize`Work from ${formats.number(Number(claim.from_percent))}:from: to ${formats.figure('percent', Number(claim.to_percent))}:to:`;
  }
}
