import type { System } from '#shared/buildups/buildup';
import type { LayingMinutes } from '#shared/buildups/buildup-card';
import type { ZoneFacts, ZoneLaying } from '#shared/buildups/zone-facts';

function looseMinutes(laying: ZoneLaying, card: LayingMinutes): number {
  if (laying.form === 'ribbon') return card.ribbon_minutes_m;
  if (laying.way === 'lays') return card.lays_minutes;
  return laying.way === 'sheets' ? card.sheets_minutes : card.patches_minutes;
}

/** What the minutes of laying hang on. */
type Laid = Pick<ZoneFacts, 'laying' | 'finish'>;

function transferFactor(facts: Laid, card: LayingMinutes): number {
  if (facts.laying?.form !== 'transfer') return 1;
  return facts.finish === 'carved' ? card.transferCarvedFactor : card.transferFlatFactor;
}

/** Minutes of laying one leaf (sheets, patches), one piece (lays) or one metre (ribbon) of a zone; 0 where nothing is laid. House values. */
export function minutesPerLaid(facts: Laid, system: System, card: LayingMinutes): number {
  if (!facts.laying) return 0;
  const onSize = system === 'water' || facts.laying.form === 'ribbon' ? 1 : card.onSizeFactor;
  return looseMinutes(facts.laying, card) * onSize * transferFactor(facts, card);
}
