import type { ClientIssue } from '#shared/client-page/client-issue-schema';
import { buildUpsUsed } from '#shared/estimates/buildups-used';
import { clientCautions } from '#shared/documents/client-cautions';
import type { Figures } from '#shared/estimates/figures';
import { isEmptyAlternative } from '#shared/estimates/is-empty-alternative';
import { pricedScope, scopeTexts } from '#shared/estimates/scope-texts';
import type { Snapshot } from '#shared/estimates/snapshot';
import { paperWords } from '../documents';
import { presentBuildUp, presentClientAlternative } from './client-alternatives-presenter';
import { presentClientPieces } from './client-pieces-presenter';
import { presentClientPrice } from './client-price-presenter';

/** What is written on the issue; what is not included is said where nobody wrote it, beside the lines that say what is. */
function textsOf(snapshot: Snapshot) {
  const { introduction, included, terms, presentation } = snapshot.draft.settings;
  const { excluded } = scopeTexts(pricedScope(snapshot), paperWords(snapshot.workshop).say);
  const { note, issuedBy, client } = snapshot;
  return { introduction, included, excluded, terms, presentation, note, issuedBy, addressee: { ...client } };
}

/** Its dates; what they assume of benches, hands and hours stays with the workshop. */
function programmeOf({ programme }: Snapshot): ClientIssue['programme'] {
  if (!programme) return null;
  const { startsOn, finishesOn, offeredOn, workingDays } = programme;
  return { startsOn, finishesOn, offeredOn, workingDays };
}

/**
 * The part of a client's page that an issue froze: nothing in it changes from one reading to the next, and none of it knows what anything cost.
 * `alternatives` has the figures of each alternative by itself; none where the issue was worked by an earlier reckoning.
 */
export function presentClientFrozen(snapshot: Snapshot, alternatives: ReadonlyMap<string, Figures>) {
  const { figures, draft, leafValidUntil } = snapshot;
  return {
    ...textsOf(snapshot),
    leafValidUntil: figures.leaf.length > 0 ? leafValidUntil : null,
    pieces: presentClientPieces(snapshot, alternatives),
    buildUps: buildUpsUsed(figures.zones).map(presentBuildUp),
    price: presentClientPrice(snapshot),
    alternatives: draft.settings.alternatives
      .filter(({ id }) => !isEmptyAlternative(snapshot.draft, id))
      .map((one) => presentClientAlternative(snapshot, one, alternatives.get(one.id))),
    programme: programmeOf(snapshot),
    isDrying: figures.dry.lots.some((lot) => lot.drying_minutes > 0),
    cautions: clientCautions({ findings: figures.findings, isRestoration: draft.settings.restoration }),
    varies: (snapshot.varies ?? []).map(({ number, letter, title }) => ({ number, letter, title })),
  };
}

export type ClientFrozen = ReturnType<typeof presentClientFrozen>;
