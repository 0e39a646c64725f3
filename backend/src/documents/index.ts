export { PaperMaking } from './paper-making';
// What papers of later features are set with.
export { addressBlock } from './address-block';
export { fileName } from './file-names';
export { letterheadBlock, printableLogo } from './letterhead';
export type { Block } from './paper/flow';
export { finishedPaper } from './paper/finished-paper';
export type { Pdf } from './paper/open-paper';
export { textStyles } from './paper/paper-colours';
export { sectionBlocks } from './paper/section-blocks';
export { tableBlock, type TableColumn, type TableRow } from './paper/table-block';
export { textBlock } from './paper/text-block';
export { paperWords, type PaperWords } from './paper-words';
export { NameBook } from './workbook/name-book';
export { formula, Sheet, type SheetColumn } from './workbook/sheet';
export { workbookBytes } from './workbook/workbook-bytes';
