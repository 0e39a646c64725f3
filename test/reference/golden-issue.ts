import { readFileSync } from 'node:fs';
import * as path from 'node:path';
import type { EstimateInput } from '#shared/estimates/estimate-figures';
import type { goldenTotals } from './golden-totals';

/** What an issue froze to be worked from, and what a calculator of a version made of it. */
export interface GoldenIssue {
  readonly calculatorVersion: number;
  readonly input: EstimateInput;
  readonly worked: ReturnType<typeof goldenTotals>;
}

export const goldenIssueFile = path.join(__dirname, 'golden-issue.json');

export const goldenIssue = (): GoldenIssue => JSON.parse(readFileSync(goldenIssueFile, 'utf8')) as GoldenIssue;
