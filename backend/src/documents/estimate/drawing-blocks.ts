import { buildUpsUsed, type UsedBuildUp } from '#shared/estimates/buildups-used';
import { pricedScope, unworkedOfChoice } from '#shared/estimates/scope-texts';
import { drawnMembers } from '../drawn-members';
import { drawnStrip } from '../drawn-strips';
import { figureRows, figureWidth } from '../paper/figure-rows';
import type { Block } from '../paper/flow';
import type { Pdf } from '../paper/open-paper';
import { textStyles } from '../paper/paper-colours';
import { sectionBlocks } from '../paper/section-blocks';
import { textBlock } from '../paper/text-block';
import type { IssueContent } from './issue-content';

/** A note that stays with the row beneath it. */
function noted(pdf: Pdf, note: string, rows: readonly Block[]): Block[] {
  if (rows.length === 0) return [];
  const text = textBlock(pdf, note, { style: textStyles.note });
  return [{ ...text, lead_pt: text.lead_pt + rows[0].lead_pt }, ...rows];
}

/** The members that are worked, drawn to scale, three abreast. */
export function memberDrawingBlocks(pdf: Pdf, content: IssueContent): Block[] {
  const { draft, words, snapshot } = content;
  const unworked = unworkedOfChoice(pricedScope(snapshot)).map(({ id }) => id);
  const members = draft.members.filter(({ id }) => !unworked.includes(id));
  const box = { width_pt: figureWidth(pdf, 3), height_pt: 150 };
  const figures = drawnMembers(pdf, members, { box, words, isForTheBench: false });
  const rows = figureRows(pdf, figures, 3);
  return sectionBlocks(pdf, words.say('paper-drawings'), noted(pdf, words.say('paper-drawings-note'), rows));
}

/** Where a build-up is used: the members with the zones that get it. */
function placesOf({ zoneIds }: UsedBuildUp, { draft }: IssueContent): string[] {
  const members = draft.members.filter((member) => member.zones.some((zone) => zoneIds.includes(zone.id)));
  return [...new Set(members.map((member) => member.name))];
}

const shownPlaces = 6;

/** The build-ups as cross-sections of their layers, two abreast. */
export function buildUpBlocks(pdf: Pdf, content: IssueContent): Block[] {
  const { words, snapshot } = content;
  const figures = buildUpsUsed(snapshot.figures.zones).map((used) => {
    const places = placesOf(used, content);
    const names = places.slice(0, shownPlaces).join(', ');
    const more = places.length - shownPlaces;
    return {
      figure: drawnStrip(pdf, used, { words, width_pt: figureWidth(pdf, 2) }),
      caption: used.buildUp,
      note: more > 0 ? words.say('paper-zones-more', { names, more }) : names,
    };
  });
  const rows = figureRows(pdf, figures, 2);
  return sectionBlocks(pdf, words.say('paper-buildups'), noted(pdf, words.say('paper-buildups-note'), rows));
}
