import type { UseFigures } from '#shared/estimates/figures';
import type { Member } from '#shared/estimates/member';
import type { Triple } from '#shared/units/triple';
import { tripleSum } from '#shared/units/triple-sum';

/** One ornament over the whole job: whole pieces and repeats, and what is counted by the length of run or by area. */
export interface OrnamentSum {
  readonly name: string;
  readonly pieces: number;
  readonly run_mm: number;
  readonly area_mm2: number;
  readonly hours: Triple;
}

type Amount = Pick<OrnamentSum, 'pieces' | 'run_mm' | 'area_mm2'>;

/** What is counted in pieces has a whole number of them; lengths and areas are as they were entered, for all alike. */
function amountOf({ useId, quantity, fit }: UseFigures, members: readonly Member[]): Amount {
  const member = members.find(({ ornaments }) => ornaments.some(({ id }) => id === useId));
  const extent = member?.ornaments.find(({ id }) => id === useId)?.extent;
  const none = { pieces: 0, run_mm: 0, area_mm2: 0 };
  if (extent?.way === 'area') return { ...none, area_mm2: extent.area_mm2 * (member?.count ?? 1) };
  if (extent?.way === 'run' && !fit) return { ...none, run_mm: extent.run_mm * extent.runs * (member?.count ?? 1) };
  return { ...none, pieces: quantity };
}

/** The ornaments of an estimate, each with all its uses together, in the order they first appear; mm and mm². */
export function ornamentSums(uses: readonly UseFigures[], members: readonly Member[]): OrnamentSum[] {
  const names = [...new Set(uses.map(({ ornament }) => ornament))];
  return names.map((name) => {
    const own = uses.filter(({ ornament }) => ornament === name);
    const amounts = own.map((use) => amountOf(use, members));
    const sum = (key: keyof Amount) => amounts.reduce((total, amount) => total + amount[key], 0);
    return {
      ...{ name, pieces: sum('pieces'), run_mm: sum('run_mm'), area_mm2: sum('area_mm2') },
      hours: tripleSum(own.map(({ carving }) => carving)),
    };
  });
}
