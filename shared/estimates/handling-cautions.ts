import type { Draft } from '#shared/estimates/draft';
import type { MeasuredMember } from '#shared/estimates/measured-member';
import { solidVolume } from '#shared/measure/solid-volume';
import type { Surface } from '#shared/measure/surface';
import type { RateCard } from '#shared/rate-cards/rate-card';
import type { Finding } from '#shared/words/finding';

// From these on one pair of hands is not enough: common practice, no source.
const heavy_kg = 20;
const bulky_mm = 1500;
const bulky_mm2 = 1_500_000;
// A long bead weighs nothing; a long rail or panel does.
const broad_mm2 = 300_000;

interface Load {
  readonly name: string;
  /** Null where nobody can tell: then it goes by size. */
  readonly weight_kg: number | null;
  readonly isBulky: boolean;
}

const isHeavy = ({ weight_kg, isBulky }: Load): boolean => (weight_kg === null ? isBulky : weight_kg >= heavy_kg);

const isLong = ({ sides_mm }: Surface): boolean => sides_mm.some((side_mm) => side_mm > bulky_mm);

function loadOf({ member, surface }: MeasuredMember, card: RateCard): Load {
  const volume_mm3 = solidVolume(member.shape);
  const density = card.carving.timbers.find(({ id }) => id === member.timberId)?.density_kgm3 ?? null;
  const weight_kg = volume_mm3 === null || density === null ? null : (volume_mm3 / 1e9) * density;
  return {
    name: member.name,
    weight_kg,
    isBulky: surface.area_mm2 > bulky_mm2 || (isLong(surface) && surface.area_mm2 > broad_mm2),
  };
}

/** A whole piece: what is known of its weight, and whether its surface is that of something one person cannot carry. */
function pieceLoad(name: string, members: readonly MeasuredMember[], card: RateCard): Load {
  const known_kg = members.reduce((sum, one) => sum + (loadOf(one, card).weight_kg ?? 0) * one.member.count, 0);
  const area_mm2 = members.reduce((sum, { surface, member }) => sum + surface.area_mm2 * member.count, 0);
  return { name, weight_kg: known_kg >= heavy_kg ? known_kg : null, isBulky: area_mm2 > bulky_mm2 };
}

function lifting(pieceId: string, loads: readonly Load[]): Finding[] {
  const names = loads.filter(isHeavy).map(({ name }) => name);
  if (names.length === 0) return [];
  return [{ kind: 'caution', code: 'caution-lifting', values: { what: names.join(', ') }, about: pieceId }];
}

/**
 * What handling a piece and setting a top on it can do: lifting, by weight (volume × density of the timber) where it can be known and by size
 * elsewhere, and the engineer’s check of a top on its base. Common practice, no source.
 */
export function handlingCautions({ pieces }: Draft, members: readonly MeasuredMember[], card: RateCard): Finding[] {
  const cautions = pieces.flatMap((piece) => {
    const own = members.filter(({ member }) => member.pieceId === piece.id);
    return own.length === 0
      ? []
      : [
          ...lifting(piece.id, [pieceLoad(piece.name, own, card), ...own.map((one) => loadOf(one, card))]),
          { kind: 'caution' as const, code: 'caution-top-on-base' as const, values: {}, about: piece.id },
        ];
  });
  return cautions.length === 0 ? [] : [...cautions, { kind: 'caution', code: 'caution-defer', values: {} }];
}
