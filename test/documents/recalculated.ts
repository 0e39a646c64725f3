import { Workbook, type CellValue } from 'exceljs';
import { HyperFormula } from 'hyperformula';

/** A cell as it was written: on its sheet, with its formula, and the figure that was kept beside it. */
export interface WrittenFormula {
  readonly sheet: string;
  readonly address: string;
  readonly formula: string;
  readonly kept: number;
}

/** A workbook read back from its bytes and worked again by an engine that knows nothing of ours. */
export interface Recalculated {
  readonly workbook: Workbook;
  readonly formulas: readonly WrittenFormula[];
  /** The figure of a cell, or of a named one. */
  readonly at: (sheet: string, address: string) => unknown;
  readonly named: (name: string) => number;
  /** Changes a named cell; everything that hangs on it follows. */
  readonly change: (name: string, value: number) => void;
  /** Reads every formula again and recalculates all of it. */
  readonly rebuild: () => void;
}

type Content = string | number | boolean | null;

function contentOf(value: CellValue): Content {
  if (value === null || value === undefined) return null;
  if (typeof value === 'object' && 'formula' in value) return `=${value.formula}`;
  if (typeof value === 'number' || typeof value === 'boolean') return value;
  // A text stays one, whatever it begins with.
  return typeof value === 'string' ? `'${value}` : null;
}

function sheetsOf(workbook: Workbook): { sheets: Record<string, Content[][]>; formulas: WrittenFormula[] } {
  const sheets: Record<string, Content[][]> = {};
  const formulas: WrittenFormula[] = [];
  workbook.eachSheet((sheet) => {
    const rows: Content[][] = [];
    sheet.eachRow({ includeEmpty: true }, (row, rowNumber) => {
      rows[rowNumber - 1] = [];
      row.eachCell({ includeEmpty: true }, (cell, column) => {
        const { value } = cell;
        rows[rowNumber - 1][column - 1] = contentOf(value);
        if (value !== null && typeof value === 'object' && 'formula' in value && typeof value.formula === 'string')
          formulas.push({
            sheet: sheet.name,
            address: cell.address,
            formula: value.formula,
            kept: Number(value.result ?? 0),
          });
      });
    });
    sheets[sheet.name] = rows;
  });
  return { sheets, formulas };
}

interface Place {
  readonly sheet: string;
  readonly address: string;
}

function namesOf(workbook: Workbook): Map<string, Place> {
  const names = workbook.definedNames.model as readonly { name: string; ranges: readonly string[] }[];
  return new Map(
    names
      .filter(({ name }) => !name.startsWith('_xlnm'))
      .map(({ name, ranges }) => {
        const [, sheet = '', address = ''] = /^'?([^'!]+)'?!\$?([A-Z]+\$?\d+)$/.exec(ranges[0] ?? '') ?? [];
        return [name, { sheet, address: address.replaceAll('$', '') }] as const;
      }),
  );
}

const absolute = ({ sheet, address }: Place): string => `='${sheet}'!${address.replace(/^([A-Z]+)(\d+)$/, '$$$1$$$2')}`;

/** Reads a workbook's bytes and recalculates all of it. */
export async function recalculated(bytes: Buffer): Promise<Recalculated> {
  const workbook = new Workbook();
  await workbook.xlsx.load(bytes as unknown as ArrayBuffer);
  const { sheets, formulas } = sheetsOf(workbook);
  const names = namesOf(workbook);
  const expressions = [...names].map(([name, place]) => ({ name, expression: absolute(place) }));
  const engine = HyperFormula.buildFromSheets(sheets, { licenseKey: 'gpl-v3' }, expressions);
  const cell = ({ sheet, address }: Place) => {
    const at = engine.simpleCellAddressFromString(address, engine.getSheetId(sheet) ?? 0);
    if (!at) throw new RangeError(`no cell ${address} on ${sheet}`);
    return at;
  };
  const place = (name: string): Place => {
    const found = names.get(name);
    if (!found) throw new RangeError(`no name ${name}`);
    return found;
  };
  return {
    workbook,
    formulas,
    at: (sheet, address) => engine.getCellValue(cell({ sheet, address })),
    named: (name) => Number(engine.getCellValue(cell(place(name)))),
    change: (name, value) => void engine.setCellContents(cell(place(name)), value),
    rebuild: () => engine.rebuildAndRecalculate(),
  };
}
