import { Workbook, type CellValue, type Worksheet } from 'exceljs';
import { Rejection } from '#shared/problems/rejection';
import { refuseUnsafeArchive } from './safe-archive';

/** A cell as it was found: what stands in it, and how its number is written. */
export interface FoundCell {
  readonly value: CellValue;
  readonly format: string;
}

/** A sheet as it was found; rows and columns are counted from 1 as the program shows them. */
export interface FoundSheet {
  readonly name: string;
  readonly lastRow: number;
  readonly cell: (row: number, column: number) => FoundCell;
  readonly lastColumn: number;
}

const most = { rows: 3_000, columns: 100 } as const;

/** Everything of a sheet but its cells: ranges named there could be made to fill the memory. */
const ignored = [
  ...['sheetPr', 'dimension', 'sheetViews', 'sheetFormatPr', 'cols', 'autoFilter', 'mergeCells', 'rowBreaks'],
  ...['hyperlinks', 'pageMargins', 'dataValidations', 'pageSetup', 'headerFooter', 'printOptions', 'picture'],
  ...['drawing', 'sheetProtection', 'tableParts', 'conditionalFormatting', 'extLst'],
];

function foundSheet(sheet: Worksheet): FoundSheet {
  if (sheet.rowCount > most.rows || sheet.columnCount > most.columns)
    throw new Rejection('too-large', 'workbook-too-large');
  return {
    name: sheet.name,
    lastRow: sheet.rowCount,
    lastColumn: sheet.columnCount,
    cell: (row, column) => {
      const { value, numFmt } = sheet.getRow(row).getCell(column);
      return { value, format: numFmt ?? '' };
    },
  };
}

async function loaded(bytes: Buffer): Promise<Workbook> {
  const workbook = new Workbook();
  // Names of cell ranges would be spread out cell by cell: they go into a model nobody reads.
  Object.assign(workbook, { _definedNames: { model: [] } });
  const options = { ignoreNodes: ignored, maxRows: most.rows, maxCols: most.columns };
  try {
    return await workbook.xlsx.load(bytes as unknown as ArrayBuffer, options);
  } catch {
    throw new Rejection('unsupported', 'workbook-not-xlsx');
  }
}

/** The sheets of a workbook, read with nothing but their cells. Refused as unsupported where it is none, as too large where it is. */
export async function readSheets(bytes: Buffer): Promise<FoundSheet[]> {
  refuseUnsafeArchive(bytes);
  return (await loaded(bytes)).worksheets.map(foundSheet);
}
