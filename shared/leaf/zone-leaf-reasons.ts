import { layingReasons } from '#shared/leaf/laying-reasons';
import type { LeafFinish } from '#shared/leaf/leaf-card';
import type { ZoneLeafInput } from '#shared/leaf/zone-leaf-input';
import type { ZoneLeaf } from '#shared/leaf/laying';
import type { Reason } from '#shared/words/reason';

type Worked = Omit<ZoneLeaf, 'reasons' | 'findings'>;

// A step that changes nothing is not told.
const unlessOne = (reason: Reason): Reason[] => (reason.figure === 1 ? [] : [reason]);

const ofShare = (share: number): Reason => ({ code: 'leaf-share', values: {}, figure: share * 100, unit: 'percent' });

function splitReasons({ openings_mm2, surface, share, members, relief, reliefFactor }: ZoneLeafInput): Reason[] {
  const open = surface.area_mm2 > 0 ? Math.max(0, 1 - openings_mm2 / surface.area_mm2) : 1;
  const house = 'measure.reliefFactors';
  return [
    ...unlessOne({ code: 'leaf-openings', values: { openings_mm2 }, figure: open, unit: 'factor' }),
    ...(share === 1 ? [] : [ofShare(share)]),
    ...unlessOne({ code: 'leaf-members', values: {}, figure: members, unit: 'factor' }),
    ...unlessOne({ code: 'leaf-relief', values: { relief }, figure: reliefFactor, unit: 'factor', house }),
  ];
}

const isMatte = (finish: LeafFinish): boolean => finish === 'water-matte';

function secondReasons({ way, losses }: Worked): Reason[] {
  const houseOf = (finish: LeafFinish) => `leaf.secondLaying_percent.${finish}.${way}`;
  const [only, ...others] = losses.secondLayings;
  const all: Reason = { code: 'leaf-second-laying', values: {}, figure: losses.second_percent.likely, unit: 'percent' };
  if (others.length === 0) return [{ ...all, house: houseOf(only.finish) }];
  const parts = losses.secondLayings.map(({ finish, share, percent }): Reason => ({
    code: isMatte(finish) ? 'leaf-second-matte' : 'leaf-second-burnished',
    values: { share_percent: share * 100 },
    figure: percent.likely,
    unit: 'percent',
    house: houseOf(finish),
  }));
  return [...parts, { ...all, code: 'leaf-second-blended' }];
}

function lossReasons(worked: Worked): Reason[] {
  const { way, losses } = worked;
  const of = `leaf.losses.${way}`;
  return [
    ...secondReasons(worked),
    {
      code: 'leaf-faulting',
      values: {},
      figure: losses.faulting_percent.likely,
      unit: 'percent',
      house: `${of}.faulting_percent`,
    },
    {
      code: 'leaf-breakage',
      values: {},
      figure: 1 - losses.breakage_percent.likely / 100,
      unit: 'divisor',
      house: `${of}.breakage_percent`,
    },
  ];
}

/** Why a zone takes so many leaves: laying, share, relief, net, each loss, and the leaves, from where every loss is at its own tenth to where every one is at its ninetieth percentile. */
export function zoneLeafReasons(input: ZoneLeafInput, worked: Worked): Reason[] {
  if (!worked.laying) return [];
  const range = { low: worked.grossLeaves_p10, high: worked.grossLeaves_p90 };
  const code = worked.laying.way === 'ribbon' ? 'leaf-rolls' : 'leaf-leaves';
  return [
    ...layingReasons(worked.laying),
    ...splitReasons(input),
    { code: 'leaf-net', values: { area_mm2: worked.trueArea_mm2 }, figure: worked.netLeaves, unit: 'number' },
    ...lossReasons(worked),
    { code, values: range, figure: worked.grossLeaves.likely, unit: 'number' },
  ];
}
