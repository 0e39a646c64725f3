import { laidField, type LaidField } from '#shared/leaf/laid-field';
import { allowedStrips, laysLaying } from '#shared/leaf/lays-laying';
import type { LayingWay, LeafCard } from '#shared/leaf/leaf-card';
import type { LeafProduct } from '#shared/leaf/leaf-product';
import { hasRoomForLaps, type LeafStep } from '#shared/leaf/leaf-step';
import { patchesLaying } from '#shared/leaf/patches-laying';
import { proposedWay } from '#shared/leaf/proposed-way';
import { ribbonLaying } from '#shared/leaf/ribbon-laying';
import { smallFace } from '#shared/leaf/small-face';
import { sheetsLaying } from '#shared/leaf/sheets-laying';
import type { ZoneLeafInput } from '#shared/leaf/zone-leaf-input';
import type { Laying } from '#shared/leaf/laying';
import type { Finding, FindingKind } from '#shared/words/finding';
import type { WordCode, WordValues } from '#shared/words/word-code';

/** How one member is laid; null where it cannot be. */
export interface ZoneLaying {
  readonly way: LayingWay;
  readonly laying: Laying | null;
  readonly findings: readonly Finding[];
}

interface Job {
  readonly input: ZoneLeafInput;
  readonly product: LeafProduct;
  readonly card: LeafCard;
  readonly field: LaidField;
}

const stepOf = ({ product, card }: Job, way: LayingWay): LeafStep => ({
  side_mm: product.side_mm,
  lap_mm: card.laps_mm[way],
});

const tell = (
  { input }: Job,
  kind: FindingKind,
  said: { readonly code: WordCode; readonly values?: WordValues },
): Finding => ({
  kind,
  code: said.code,
  values: said.values ?? {},
  about: input.zoneId,
});

const isCarved = ({ relief, finish }: ZoneLeafInput): boolean => relief !== 'flat' || finish === 'carved';

const laid = (way: LayingWay, laying: Laying, findings: readonly Finding[] = []): ZoneLaying => ({
  way,
  laying,
  findings,
});

function asSheets(job: Job): ZoneLaying {
  return laid('sheets', sheetsLaying(job.field, stepOf(job, 'sheets')));
}

function asPatches(job: Job): ZoneLaying {
  const cuts = job.input.cuts ?? job.card.patchCuts;
  const step = stepOf(job, 'patches');
  if (hasRoomForLaps(step, cuts)) return laid('patches', patchesLaying(job.field.area_mm2, step, cuts));
  const values = { cuts, lap_mm: step.lap_mm };
  return { way: 'patches', laying: null, findings: [tell(job, 'refuse', { code: 'leaf-cuts-too-small', values })] };
}

function asLays(job: Job): ZoneLaying {
  const { input, product } = job;
  const run = job.field.moulding ?? smallFace(input, product.side_mm);
  if (!run) {
    const patched = asPatches(job);
    return { ...patched, findings: [tell(job, 'warn', { code: 'leaf-lays-need-run' }), ...patched.findings] };
  }
  const step = stepOf(job, 'lays');
  const strips = input.strips;
  const isTooNarrow = strips !== null && !allowedStrips(step).includes(strips);
  const laying = laysLaying(run, step, {
    strips,
    fewestStrips: isCarved(input) ? 2 : 1,
    leafCost: Number(product.price) / product.leavesPerBooklet,
    pieceCost: input.pieceCost,
    isAlone: input.members === 1,
  });
  const values = { strips: strips ?? 0, lap_mm: step.lap_mm };
  return laid('lays', laying, isTooNarrow ? [tell(job, 'refuse', { code: 'leaf-strips-too-narrow', values })] : []);
}

function asRibbon(job: Job, roll_mm: number): ZoneLaying {
  const { field } = job;
  const along = field.moulding && {
    length_mm: field.moulding.run_mm,
    height_mm: field.moulding.girth_mm,
    closed: field.moulding.closedRun,
  };
  const courses = field.courses.length > 0 || !along ? field.courses : [along];
  return laid('sheets', ribbonLaying({ area_mm2: field.area_mm2, courses }, stepOf(job, 'sheets'), roll_mm));
}

const ways = { sheets: asSheets, lays: asLays, patches: asPatches } as const;

/** Lays one member of a zone with a product in the way that was chosen, else in the proposed one; mm, mm² and leaves not rounded. */
export function zoneLaying(input: ZoneLeafInput, product: LeafProduct, card: LeafCard): ZoneLaying {
  const way = product.form === 'ribbon' ? 'sheets' : (input.way ?? proposedWay(input, product.side_mm));
  const job: Job = { input, product, card, field: laidField(input) };
  const step = stepOf(job, way);
  if (!hasRoomForLaps(step, 1)) {
    const values = { side_mm: step.side_mm, lap_mm: step.lap_mm };
    return { way, laying: null, findings: [tell(job, 'refuse', { code: 'leaf-lap-too-wide', values })] };
  }
  return product.ribbon_mm !== null ? asRibbon(job, product.ribbon_mm) : ways[way](job);
}
