import { buildUpsUsed, type UsedBuildUp } from '#shared/estimates/buildups-used';
import type { DryLot } from '#shared/estimates/dry-figures';
import type { UseFigures, ZoneFigures } from '#shared/estimates/figures';
import type { Member, Piece } from '#shared/estimates/member';
import { zonesOfLot } from '#shared/estimates/zones-of-lot';
import type { Finding } from '#shared/words/finding';
import type { BenchSheetRequest } from '../../estimates';
import { paperWords, type PaperWords } from '../paper-words';

/** A lot with its build-up drawn, what its members call it (empty: as proposed), and what is coated in it. */
export interface BenchLot {
  readonly lot: DryLot;
  readonly used: UsedBuildUp | null;
  readonly name: string;
  readonly zones: readonly ZoneFigures[];
  readonly members: readonly Member[];
}

/** One piece with everything worked on it, ready to be written for the bench. */
export interface BenchContent {
  readonly request: BenchSheetRequest;
  readonly words: PaperWords;
  readonly piece: Piece;
  readonly members: readonly Member[];
  readonly zones: readonly ZoneFigures[];
  readonly uses: readonly UseFigures[];
  readonly lots: readonly BenchLot[];
  readonly findings: readonly Finding[];
}

/** What is told of the piece, of something in it, or of nothing in particular. */
function findingsOf(request: BenchSheetRequest, own: ReadonlySet<string>): Finding[] {
  const { members, pieces } = request.draft;
  const foreign = new Set([
    ...pieces.map((piece) => piece.id),
    ...members.flatMap((member) => [
      member.id,
      ...member.zones.map(({ id }) => id),
      ...member.ornaments.map(({ id }) => id),
    ]),
    ...request.figures.dry.lots.map((lot) => lot.lotId),
  ]);
  return request.figures.findings.filter(({ about }) => about === undefined || own.has(about) || !foreign.has(about));
}

function benchLot(lot: DryLot, own: Pick<BenchContent, 'members' | 'zones'>): BenchLot {
  const coated = zonesOfLot(own.members, lot.lotId);
  const zones = own.zones.filter(({ zoneId }) => coated.some(({ zone }) => zone.id === zoneId));
  const members = own.members.filter(({ id }) => zones.some(({ memberId }) => memberId === id));
  const name = members.at(0)?.lot ?? '';
  return { lot, used: buildUpsUsed(zones).at(0) ?? null, name, zones, members };
}

/** Gathers a piece and its work; RangeError for a piece the draft does not hold. */
export function benchContent(request: BenchSheetRequest): BenchContent {
  const { draft, figures, pieceId } = request;
  const piece = draft.pieces.find((one) => one.id === pieceId);
  if (!piece) throw new RangeError('the draft holds no such piece');
  const members = draft.members.filter((member) => member.pieceId === pieceId);
  const ids = new Set(members.map((member) => member.id));
  const zones = figures.zones.filter((zone) => ids.has(zone.memberId));
  const uses = figures.uses.filter((use) => ids.has(use.memberId));
  const lots = figures.dry.lots.filter((lot) => lot.pieceId === pieceId);
  const own = [piece.id, ...ids, ...zones.map((zone) => zone.zoneId), ...uses.map((use) => use.useId)];
  return {
    ...{ request, piece, members, zones, uses },
    words: paperWords(request.workshop),
    lots: lots.map((lot) => benchLot(lot, { members, zones })),
    findings: findingsOf(request, new Set([...own, ...lots.map((lot) => lot.lotId)])),
  };
}
