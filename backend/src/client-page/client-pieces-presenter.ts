import type { ClientIssue } from '#shared/client-page/client-issue-schema';
import type { Figures } from '#shared/estimates/figures';
import type { Member } from '#shared/estimates/member';
import type { Snapshot } from '#shared/estimates/snapshot';

type Piece = ClientIssue['pieces'][number];

/** What is carved on a member and how it is finished, each named once. */
function named(member: Member, figures: readonly Figures[]): Pick<Piece['members'][number], 'ornaments' | 'finishes'> {
  const uses = figures.flatMap((one) => one.uses.filter((use) => use.memberId === member.id));
  const zones = figures.flatMap((one) => one.zones.filter((zone) => zone.memberId === member.id));
  const finishes = zones.map(({ buildUp, leaf }) => (leaf ? `${buildUp}: ${leaf.name}` : buildUp));
  return { ornaments: [...new Set(uses.map(({ ornament }) => ornament))], finishes: [...new Set(finishes)] };
}

function memberOf(member: Member, figures: readonly Figures[]): Piece['members'][number] {
  const { id, name, count, shape, zones, alternativeId } = member;
  const timber = figures.flatMap((one) => one.members).find(({ memberId }) => memberId === id)?.timber ?? '';
  const zoneIds = zones.map((zone) => zone.id);
  const drawn = { id, name, count, timber, shape, zoneIds, alternativeId };
  return { ...drawn, ...named(member, figures) } as Piece['members'][number];
}

/**
 * The pieces with their members as a client sees them: drawn and named, without notes of the bench. Those of alternatives are named from
 * the figures of their alternative.
 */
export function presentClientPieces({ draft, figures }: Snapshot, others: ReadonlyMap<string, Figures>): Piece[] {
  const figuresOf = ({ alternativeId }: Member): Figures[] => {
    const own = alternativeId === null ? figures : others.get(alternativeId);
    return own ? [own] : [];
  };
  return draft.pieces.map(({ id, name }) => ({
    id,
    name,
    members: draft.members.filter(({ pieceId }) => pieceId === id).map((member) => memberOf(member, figuresOf(member))),
  }));
}
