export { benchSheet } from './bench-sheet/bench-sheet';
export { issuePapers } from './issue-papers';
