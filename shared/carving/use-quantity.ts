import type { CarvedUse } from '#shared/carving/carving-work';
import type { OrnamentWay } from '#shared/carving/ornament';
import { type RunFit, runFit } from '#shared/carving/run-fit';
import { settled } from '#shared/money/settled';
import type { Finding } from '#shared/words/finding';

/** What is counted: pieces, reference lengths or reference squares, over all identical members. */
export interface UseQuantity {
  readonly quantity: number;
  readonly fit: RunFit | null;
  readonly findings: readonly Finding[];
}

/** How an ornament or item of the card is counted; a reference of null counts by the piece, or in tenths of a metre. */
export interface Counted {
  readonly name: string;
  readonly way: OrnamentWay;
  readonly reference_mm: number | null;
}

const nothing = (finding: Finding): UseQuantity => ({ quantity: 0, fit: null, findings: [finding] });

const unfit = ({ use }: CarvedUse, counted: Counted): UseQuantity =>
  nothing({
    kind: 'refuse',
    code: 'carving-extent-unfit',
    values: { ornament: counted.name, way: counted.way },
    about: use.id,
  });

function onRuns({ use, members }: CarvedUse, counted: Counted): UseQuantity {
  if (use.extent.way !== 'run') return { quantity: 0, fit: null, findings: [] };
  const { run_mm, runs } = use.extent;
  const module_mm =
    counted.way === 'piece' ? (use.size_mm ?? counted.reference_mm ?? 100) : (counted.reference_mm ?? 100);
  const fit = runFit(use.extent, module_mm);
  if (run_mm > 0 && fit.repeats === 0) {
    return nothing({
      kind: 'refuse',
      code: 'carving-run-too-short',
      values: { ornament: counted.name, run_mm },
      about: use.id,
    });
  }
  if (counted.way === 'piece') return { quantity: fit.repeats * runs * members, fit, findings: [] };
  return { quantity: (Math.max(0, fit.free_mm) / module_mm) * runs * members, fit: null, findings: [] };
}

function onArea({ use, members }: CarvedUse, counted: Counted): UseQuantity {
  const area_mm2 = use.extent.way === 'area' ? use.extent.area_mm2 : 0;
  return { quantity: settled((area_mm2 / (counted.reference_mm ?? 100) ** 2) * members), fit: null, findings: [] };
}

/**
 * Counts one use over all identical members: pieces are whole, a piece along runs is fitted in whole repeats, a length or area goes by
 * the reference. An extent that does not suit the ornament, and a run its mitre leaves fill, are refused in a finding.
 */
export function useQuantity(carved: CarvedUse, counted: Counted): UseQuantity {
  const { way } = carved.use.extent;
  if (way === 'pieces' && counted.way === 'piece') {
    return { quantity: carved.use.extent.count * carved.members, fit: null, findings: [] };
  }
  if (way === 'run' && counted.way !== 'area') return onRuns(carved, counted);
  if (way === 'area' && counted.way === 'area') return onArea(carved, counted);
  return unfit(carved, counted);
}
