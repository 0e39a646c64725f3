import { measuredNote } from '#shared/documents/measured-note';
import { measuresOf } from '#shared/estimates/price/measured-work';
import type { PriceLine } from '#shared/estimates/price/price';
import type { WorkKind } from '#shared/estimates/price/work-kind';
import { printableText } from '#shared/words/printable-text';
import { type IssueContent, memberOf } from './issue-content';

/** What a kind of work is called on paper. */
export const kindName = ({ words }: IssueContent, kind: WorkKind): string => words.say(`work-kind-${kind}`);

/** What a member is called; the job as a whole where there is none. */
export const memberName = (content: IssueContent, id: string | null): string =>
  memberOf(content, id)?.name ?? content.words.say('paper-general-lines');

/** The rule and the quantity a measured line is paid by, and its measures. */
export function lineNote({ draft, words }: IssueContent, line: PriceLine): string {
  const extra = draft.settings.extras.find((one) => one.id === line.id);
  if (extra?.kind !== 'paid-quantity') return '';
  const { unit, rule, measured } = extra;
  const quantity = words.figure('number', Number(extra.quantity));
  const measures = measured ? measuresOf(measured) : [];
  return measuredNote({ quantity, unit, rule, measures }, (code, values) => words.say(code, values));
}

/** What stands under the name of a member: how many, in which timber, what is carved on it, how it is finished. */
export function memberNote(content: IssueContent, id: string): string {
  const { snapshot, draft, words } = content;
  const member = draft.members.find((one) => one.id === id);
  if (!member) return '';
  const { members, uses, zones } = snapshot.figures;
  const finishes = zones
    .filter((zone) => zone.memberId === id)
    .map((zone) => (zone.leaf ? `${zone.buildUp}: ${zone.leaf.name}` : zone.buildUp));
  const parts = [
    ...(member.count > 1 ? [words.say('paper-member-count', { count: member.count })] : []),
    members.find((one) => one.memberId === id)?.timber ?? '',
    ...uses.filter((use) => use.memberId === id).map((use) => use.ornament),
    ...finishes,
  ];
  return [...new Set(parts.map(printableText))].filter((part) => part !== '').join(' · ');
}
