export { benchSheet } from './bench-sheet/bench-sheet';
export type { BenchSheetRequest } from './bench-sheet-request';
export type { IssuePaper } from './issue-paper';
export { issuePapers } from './issue-papers';
