import type { BuildUp, BuildUpStep } from '#shared/buildups/buildup';
import type { WorkedZone } from '#shared/estimates/worked-zone';
import type { LayingWay } from '#shared/leaf/leaf-card';
import type { GildingRates } from './gilding-rates';
import { layingParts } from './gross-formula';
import type { LeafPages } from './leaf-pages';
import type { TakeOff } from './take-off-sheet';

/** What the hours of a step are worked from: the zone, the sheets before, the address of its coats. */
export interface StepPlace {
  readonly zone: WorkedZone;
  readonly buildUp: BuildUp;
  readonly takeOff: TakeOff;
  readonly leaf: LeafPages;
  readonly rates: GildingRates;
  readonly coats: string;
}

/** Part of the zone a step goes on, burnished or matte, by its own share or the card's. */
function areaPart(step: BuildUpStep, { zone, takeOff, rates }: StepPlace): string {
  if (step.areaPart === 'all') return '';
  const own = zone.zone.burnished_percent === null ? null : takeOff.burnished.get(zone.zone.id);
  const share = `${own ?? rates.burnished}/100`;
  return step.areaPart === 'burnished' ? `*${share}` : `*(1-${share})`;
}

function finishFactor(factors: 'finish' | 'smoothing' | 'none', { zone, rates }: StepPlace): string {
  return factors === 'none' ? '' : `*${rates[factors][zone.finish]}`;
}

/** Plan area × part × coats × hours a square metre × finish; ornament painted in glazes is taken out and goes by the dm². */
function byArea(step: BuildUpStep, factors: 'finish' | 'smoothing' | 'none', place: StepPlace): string {
  const { zone, takeOff, rates, buildUp, coats } = place;
  const plan = takeOff.plan.get(zone.zone.id) ?? '0';
  const painted =
    zone.zone.painted_percent > 0 && step.kind === 'glaze' ? takeOff.painted.get(zone.zone.id) : undefined;
  const plain = painted === undefined ? plan : `${plan}*(1-${painted}/100)`;
  const factor = `${areaPart(step, place)}*${coats}*${rates.step(buildUp, step)}${finishFactor(factors, place)}`;
  const hours = `${plain}${factor}*${rates.spread}`;
  return painted === undefined ? hours : `${hours}+${plan}*${painted}*${coats}*${rates.painted}`;
}

const minutesNames = (way: LayingWay, isRibbon: boolean): LayingWay | 'ribbon' => (isRibbon ? 'ribbon' : way);

function layingMinutes({ zone, buildUp, rates }: StepPlace): string {
  const { laying } = zone.facts;
  if (!laying) return '0';
  const isRibbon = laying.form === 'ribbon';
  const onSize = buildUp.system === 'water' || isRibbon ? '' : `*${rates.onSize}`;
  const transfer = zone.finish === 'carved' ? rates.transferCarved : rates.transferFlat;
  return `${rates.laying[minutesNames(laying.way, isRibbon)]}${onSize}${laying.form === 'transfer' ? `*${transfer}` : ''}`;
}

/** Net leaves × what is handled for a leaf × the part laid now ÷ (1 − breakage), at so many minutes each. */
function byLaying(part: 'first' | 'faulting' | 'second', place: StepPlace): string | null {
  const { zone, leaf, rates } = place;
  const { id } = zone.zone;
  const [net, handled, losses] = [leaf.net.get(id), leaf.handled.get(id), leaf.losses.get(id)];
  if (!net || !handled || !losses) return null;
  const laid = `${net}*${handled}*${layingParts(losses)[part]}/(1-${losses.breakage}/100)`;
  return `${laid}*${layingMinutes(place)}/60*${rates.spread}`;
}

/** Hands-on hours of a step on a zone as a formula; null for what only waits, or is worked with the carving. */
export function handsOnFormula(step: BuildUpStep, place: StepPlace): string | null {
  const { zone, takeOff, rates } = place;
  const plan = takeOff.plan.get(zone.zone.id) ?? '0';
  const how = step.work;
  switch (how.way) {
    case 'area':
      return byArea(step, how.factors, place);
    case 'laying':
      return byLaying(how.part, place);
    case 'edge':
      return zone.facts.protectedEdge_mm > 0 ? `${takeOff.edge.get(zone.zone.id)}*${rates.edge}*${rates.spread}` : null;
    case 'consolidating':
      return `${plan}*${rates.consolidating}`;
    case 'cleaning':
      return `${plan}*${rates.cleaning}`;
    case 'recutting':
    case 'waiting':
      return null;
  }
}
