export type { BenchSheetRequest } from './bench-sheet-request';
export type { IssuePaper } from './issue-paper';
