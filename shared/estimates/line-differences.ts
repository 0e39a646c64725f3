import type { WorkKind } from '#shared/estimates/price/work-kind';
import type { PriceLine } from '#shared/estimates/price/price';
import type { MinorUnits } from '#shared/money/decimal';

/** The lines of a price with the names of the members they speak of. */
export interface NamedLines {
  readonly lines: readonly PriceLine[];
  readonly memberNames: Readonly<Record<string, string>>;
}

/** A line in which two prices differ; null where one of them has no such line. */
export interface LineDifference {
  readonly lineId: string;
  readonly member: string | null;
  readonly kind: WorkKind;
  readonly name: string | null;
  readonly before_minor: MinorUnits | null;
  readonly after_minor: MinorUnits | null;
}

/** Line by line, in whole minor units, where two prices of one estimate differ; lines that are alike are left out. */
export function lineDifferences(before: NamedLines, after: NamedLines): LineDifference[] {
  const earlier = new Map(before.lines.map((line) => [line.id, line]));
  const later = new Map(after.lines.map((line) => [line.id, line]));
  const ids = [...new Set([...later.keys(), ...earlier.keys()])];
  return ids.flatMap((lineId) => {
    const line = later.get(lineId) ?? earlier.get(lineId);
    const before_minor = earlier.get(lineId)?.price_minor ?? null;
    const after_minor = later.get(lineId)?.price_minor ?? null;
    if (!line || before_minor === after_minor) return [];
    const names = later.has(lineId) ? after.memberNames : before.memberNames;
    const member = line.memberId === null ? null : (names[line.memberId] ?? null);
    return [{ lineId, member, kind: line.kind, name: line.name, before_minor, after_minor }];
  });
}
