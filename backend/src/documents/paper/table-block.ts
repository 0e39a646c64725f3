import type { Block, Flow } from './flow';
import type { Pdf } from './open-paper';
import { paperColours } from './paper-colours';
import { type LaidColumn, laidColumns, laidRow, type LaidRow, type TableColumn, type TableRow } from './laid-columns';
import { writeLine } from './text-lines';
import { widthOf } from './text-block';

export type { TableCell, TableColumn, TableRow } from './laid-columns';

const ruleColours = { hair: paperColours.line, strong: paperColours.ink, gold: paperColours.gold } as const;

/** Space between a table and what stands above it. */
const above_pt = 5;

/** Rows that must not be parted: each hangs on the one after it as long as it says so. */
function chains(rows: readonly LaidRow[]): LaidRow[][] {
  const groups: LaidRow[][] = [];
  let group: LaidRow[] = [];
  for (const row of rows) {
    group.push(row);
    if (row.keepsWithNext) continue;
    groups.push(group);
    group = [];
  }
  return group.length > 0 ? [...groups, group] : groups;
}

const heightOf = (rows: readonly LaidRow[]): number => rows.reduce((sum, row) => sum + row.height_pt, 0);

function drawCell(flow: Flow, row: LaidRow, { lines, column }: LaidRow['cells'][number]): void {
  let y_pt = flow.y + row.before_pt + row.padding_pt;
  for (const { text, style, x_pt } of lines) {
    const place = { x_pt: flow.left + x_pt, y_pt, align: column.align };
    writeLine(flow.pdf, text, { style, place });
    y_pt += style.leading_pt;
  }
}

function drawRow(flow: Flow, row: LaidRow, tag: 'TH' | 'TD'): void {
  flow.inside('TR', () => {
    for (const cell of row.cells) {
      const isHead = tag === 'TH' || cell.isRowHead;
      const options = isHead ? { scope: tag === 'TH' ? ('Column' as const) : ('Row' as const) } : {};
      flow.inside(isHead ? 'TH' : 'TD', () => flow.draw(() => drawCell(flow, row, cell)), options);
      for (let empty = 1; empty < cell.span; empty += 1) flow.inside('TD', () => undefined);
    }
  });
}

function drawRules(flow: Flow, row: LaidRow): void {
  if (row.tint)
    flow.artifact(() =>
      flow.pdf
        .rect(flow.left, flow.y + row.before_pt, flow.width, row.height_pt - row.before_pt)
        .fill(paperColours.tint),
    );
  if (row.above !== 'none') flow.rule(flow.y + row.before_pt, ruleColours[row.above], row.above === 'hair' ? 0.6 : 0.9);
}

/** The head of a table, said once; on the pages after it is only seen. */
function drawHead(flow: Flow, head: LaidRow, isAgain: boolean): void {
  if (isAgain) flow.artifact(() => head.cells.forEach((cell) => drawCell(flow, head, cell)), 'Pagination');
  else drawRow(flow, head, 'TH');
  flow.y += head.height_pt;
}

function placeChain(flow: Flow, chain: readonly LaidRow[], head: LaidRow | null): void {
  const whole_pt = heightOf(chain);
  const isFitting = whole_pt + (head?.height_pt ?? 0) <= flow.pageHeight;
  const again = () => head && drawHead(flow, head, true);
  if (isFitting && flow.need(whole_pt)) again();
  for (const row of chain) {
    if (flow.need(row.height_pt)) again();
    drawRules(flow, row);
    drawRow(flow, row, 'TD');
    flow.y += row.height_pt;
  }
}

/** A table: its head again on every page it reaches, rows whole, chained rows together. */
export function tableBlock(pdf: Pdf, columns: readonly TableColumn[], rows: readonly TableRow[]): Block {
  const placed: LaidColumn[] = laidColumns(pdf, { columns, rows, width_pt: widthOf(pdf) });
  const laid = rows.map((row) => laidRow(pdf, row, placed));
  const hasHead = columns.some((column) => column.head !== '');
  const head = hasHead
    ? laidRow(pdf, { cells: columns.map(({ head: text }) => ({ text })), isHead: true }, placed)
    : null;
  const groups = chains(laid);
  return {
    lead_pt: above_pt + (head?.height_pt ?? 0) + heightOf(groups[0] ?? []),
    place: (flow) => {
      flow.space(above_pt);
      flow.inside('Table', () => {
        if (head) drawHead(flow, head, false);
        groups.forEach((group) => placeChain(flow, group, head));
      });
    },
  };
}
