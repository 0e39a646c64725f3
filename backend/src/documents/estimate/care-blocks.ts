import { careCodes } from '#shared/documents/care-codes';
import { clientCautions } from '#shared/documents/client-cautions';
import type { Block } from '../paper/flow';
import { listBlock } from '../paper/list-blocks';
import type { Pdf } from '../paper/open-paper';
import { sectionBlocks } from '../paper/section-blocks';
import type { IssueContent } from './issue-content';

/** How the finished piece is cared for, by what it is finished with. */
export function careBlocks(pdf: Pdf, { snapshot, draft, words }: IssueContent): Block[] {
  const { buildUps, leaf } = snapshot.card;
  const zones = draft.members.flatMap((member) => member.zones);
  const codes = careCodes({
    systems: buildUps.buildUps.filter(({ id }) => zones.some((zone) => zone.buildUpId === id)).map((one) => one.system),
    metals: leaf.products
      .filter(({ id }) => snapshot.figures.leaf.some((used) => used.productId === id))
      .map((one) => one.metal),
    isOutdoors: draft.settings.place !== 'indoors',
  });
  const texts = codes.map((code) => words.say(code));
  return sectionBlocks(pdf, words.say('paper-care'), [listBlock(pdf, texts)]);
}

/** What a client has to be warned of. */
export function cautionBlocks(pdf: Pdf, { snapshot, draft, words }: IssueContent): Block[] {
  const cautions = clientCautions({
    findings: snapshot.figures.findings,
    isRestoration: draft.settings.restoration,
  });
  const texts = cautions.map(({ code, values }) => words.say(code, values));
  return sectionBlocks(pdf, words.say('paper-cautions'), [listBlock(pdf, texts)]);
}
