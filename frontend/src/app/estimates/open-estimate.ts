/** Which estimate the workspace shows. */
export interface OpenEstimate {
  readonly jobId: string;
  readonly estimateId: string;
}
