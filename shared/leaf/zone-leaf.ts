import { keptShare, laidField } from '#shared/leaf/laid-field';
import { leafFindings } from '#shared/leaf/leaf-findings';
import type { LeafCard } from '#shared/leaf/leaf-card';
import type { LeafProduct } from '#shared/leaf/leaf-product';
import { proposedWay } from '#shared/leaf/proposed-way';
import type { ZoneLeafInput } from '#shared/leaf/zone-leaf-input';
import { zoneLeafReasons } from '#shared/leaf/zone-leaf-reasons';
import type { Laying, ZoneLeaf } from '#shared/leaf/laying';
import { zoneLaying } from '#shared/leaf/zone-laying';
import { grossPercentile, grossTriple, zoneLosses } from '#shared/leaf/zone-losses';
import { mapTriple } from '#shared/units/triple';
import type { Finding } from '#shared/words/finding';

// Laying goes by leaves for sheets and patches, by strips for lays, by metres for ribbon.
function handledPerLeaf(laying: Laying | null, product: LeafProduct): number {
  if (laying?.way === 'ribbon') return (product.ribbon_mm ?? 0) / 1000;
  return laying?.way === 'lays' && laying.leaves > 0 ? laying.pieces / laying.leaves : 1;
}

function partFindings({ zoneId, partKeys, surface }: ZoneLeafInput): Finding[] {
  const unknown = (partKeys ?? []).filter((key) => !surface.parts.some((part) => part.key === key));
  return unknown.length > 0
    ? [{ kind: 'missing', code: 'leaf-parts-unknown', values: { parts: unknown.length }, about: zoneId }]
    : [];
}

function noLeaf(input: ZoneLeafInput, card: LeafCard): ZoneLeaf {
  const way = input.way ?? proposedWay(input, 0);
  const none = { low: 0, likely: 0, high: 0 };
  return {
    zoneId: input.zoneId,
    productId: input.productId,
    ground: input.ground,
    way,
    laying: null,
    planArea_mm2: 0,
    trueArea_mm2: 0,
    netLeaves: 0,
    losses: zoneLosses(way, input, card),
    grossLeaves: none,
    grossLeaves_p10: 0,
    grossLeaves_p90: 0,
    handled: none,
    reasons: [],
    findings: [{ kind: 'missing', code: 'leaf-unknown', values: { leaf: input.productId }, about: input.zoneId }],
  };
}

function counted(input: ZoneLeafInput, product: LeafProduct, card: LeafCard): ZoneLeaf {
  const { way, laying, findings } = zoneLaying(input, product, card);
  const kept = keptShare(input) * input.members;
  const planArea_mm2 = laidField(input).area_mm2 * kept;
  const netLeaves = (laying?.leaves ?? 0) * kept * input.reliefFactor;
  const losses = zoneLosses(way, input, card);
  const grossLeaves = grossTriple(netLeaves, losses);
  const each = handledPerLeaf(laying, product);
  const worked = {
    zoneId: input.zoneId,
    productId: input.productId,
    ground: input.ground,
    way,
    laying,
    planArea_mm2,
    trueArea_mm2: planArea_mm2 * input.reliefFactor,
    netLeaves,
    losses,
    grossLeaves,
    grossLeaves_p10: grossPercentile(netLeaves, losses, 0.1),
    grossLeaves_p90: grossPercentile(netLeaves, losses, 0.9),
    handled: mapTriple(grossLeaves, (leaves) => leaves * each),
    findings: [...findings, ...partFindings(input), ...leafFindings(input, product, way)],
  };
  return Object.assign(worked, { reasons: zoneLeafReasons(input, worked) });
}

/**
 * Leaf of one zone over all identical members (leaves not rounded, areas mm²): net by the way of laying × share × relief, gross with
 * breakage, faulting and second laying, low, likely and high; every intermediate value is kept. What cannot be is a finding. House rules.
 */
export function zoneLeaf(input: ZoneLeafInput, card: LeafCard): ZoneLeaf {
  const product = card.products.find((known) => known.id === input.productId);
  return product ? counted(input, product, card) : noLeaf(input, card);
}
