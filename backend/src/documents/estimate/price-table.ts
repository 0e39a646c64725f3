import type { PriceLine } from '#shared/estimates/price/price';
import { sectionsByKind, sectionsByMember } from '#shared/estimates/price/price-sections';
import type { MinorUnits } from '#shared/money/decimal';
import type { Block } from '../paper/flow';
import type { Pdf } from '../paper/open-paper';
import { textStyles } from '../paper/paper-colours';
import { tableBlock, type TableRow } from '../paper/table-block';
import type { IssueContent } from './issue-content';
import { kindName, lineNote, memberName, memberNote } from './line-note';
import { sumRows } from './sum-rows';

const lineRow = (name: string, note: string, amount: string): TableRow => ({
  cells: [{ text: name, note, indent_pt: 12 }, { text: amount }],
  padding_pt: 1.5,
});

interface NamedSection {
  readonly name: string;
  readonly note: string;
  readonly piece: string | null;
  readonly lines: readonly { readonly name: string; readonly line: PriceLine }[];
  readonly price_minor: MinorUnits;
}

/** Members as the draft has them, whatever was priced first; the job as a whole last. */
function inDraftOrder<Section extends { readonly key: string | null }>(
  { snapshot }: IssueContent,
  sections: readonly Section[],
): Section[] {
  const { members } = snapshot.draft;
  const rank = ({ key }: Section) => (key === null ? members.length : members.findIndex((member) => member.id === key));
  return sections.toSorted((one, other) => rank(one) - rank(other));
}

function memberSections(content: IssueContent): NamedSection[] {
  const { pieces, members } = content.snapshot.draft;
  const pieceOf = (id: string | null) =>
    pieces.find((piece) => piece.id === members.find((member) => member.id === id)?.pieceId)?.name ?? null;
  return inDraftOrder(content, sectionsByMember(content.snapshot.figures.price.lines)).map(
    ({ key, lines, price_minor }) => ({
      name: memberName(content, key),
      note: key === null ? '' : memberNote(content, key),
      piece: pieces.length > 1 ? pieceOf(key) : null,
      lines: lines.map((line) => ({ name: line.name ?? kindName(content, line.kind), line })),
      price_minor,
    }),
  );
}

const kindSections = (content: IssueContent): NamedSection[] =>
  sectionsByKind(content.snapshot.figures.price.lines).map(({ key, lines, price_minor }) => ({
    name: kindName(content, key),
    note: '',
    piece: null,
    lines: lines.map((line) => ({ name: line.name ?? memberName(content, line.memberId), line })),
    price_minor,
  }));

const pieceRow = (piece: string): TableRow => ({
  cells: [{ text: piece, style: textStyles.subheading, span: 2, isRowHead: true }],
  before_pt: 8,
  keepsWithNext: true,
});

/** A section of so many lines is kept whole; of a longer one no line stands alone at either end. */
const wholeLines = 7;

/** The head of a section bears its sum, its lines follow. */
function sectionRows(content: IssueContent, section: NamedSection): TableRow[] {
  const { money } = content.words;
  const head: TableRow = {
    cells: [
      { text: section.name, note: section.note, style: textStyles.strong, isRowHead: true },
      { text: money(section.price_minor), style: textStyles.strong },
    ],
    above: 'hair',
    keepsWithNext: true,
  };
  const rows = section.lines.map(({ name, line }) => lineRow(name, lineNote(content, line), money(line.price_minor)));
  const isKept = (place: number) => place < rows.length - 1 && (rows.length <= wholeLines || place >= rows.length - 2);
  return [head, ...rows.map((row, place) => ({ ...row, keepsWithNext: isKept(place) }))];
}

function allRows(content: IssueContent, sections: readonly NamedSection[]): TableRow[] {
  const rows = sections.flatMap((section, place) => {
    const isNew = section.piece !== null && section.piece !== sections[place - 1]?.piece;
    return [...(isNew && section.piece !== null ? [pieceRow(section.piece)] : []), ...sectionRows(content, section)];
  });
  // Sums never stand alone at the head of a page: the last line goes with them.
  const last = rows.at(-1);
  return [...rows.slice(0, -1), ...(last ? [{ ...last, keepsWithNext: true }] : []), ...sumRows(content)];
}

/** The lines of an estimate, by member or by kind of work, with the sums under them; they add up whichever way they are cut. */
export function priceTable(pdf: Pdf, content: IssueContent): Block {
  const { say } = content.words;
  const isByMember = content.draft.settings.presentation === 'members';
  const sections = isByMember ? memberSections(content) : kindSections(content);
  const columns = [
    { head: say('paper-column-work'), width: 'rest' },
    { head: say('paper-column-price'), width: 'fit', align: 'right' },
  ] as const;
  return tableBlock(pdf, columns, allRows(content, sections));
}
