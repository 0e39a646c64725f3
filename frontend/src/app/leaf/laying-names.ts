import type { LayingWay } from '#shared/leaf/leaf-card';

/** Ways of laying, on screen. */
export const layingNames: Readonly<Record<LayingWay, string>> = {
  sheets: $localize`Sheets`,
  lays: $localize`Lays`,
  patches: $localize`Patches`,
};

/** “lays, 3 strips”, “patches, cut 2 by 2”, “sheets”. */
export function laidAs({ way, strips, cuts }: LaidAs): string {
  const name = layingNames[way].toLowerCase();
  if (way === 'lays' && strips !== null)
    return strips === 1 ? $localize`lays, whole leaf` : $localize`lays, ${strips}:strips: strips`;
  if (way === 'patches' && cuts !== null) return $localize`patches, ${cuts}:cuts: by ${cuts}:cutsAgain:`;
  return name;
}

/** How a zone is laid in the end. */
export interface LaidAs {
  readonly way: LayingWay;
  readonly strips: number | null;
  readonly cuts: number | null;
}
