import { existsSync, writeFileSync } from 'node:fs';
import { calculatorVersion } from '#shared/estimates/calculator-version';
import { canonicalJson } from '#shared/estimates/canonical-json';
import { startCard } from '#shared/rate-cards/start-card';
import { demonstrationDraft } from '../../seeders/demonstration-draft';
import { paintedPlinthJob } from '../../seeders/painted-plinth/painted-plinth-job';
import { goldenIssue, goldenIssueFile } from './golden-issue';
import { goldenTotals } from './golden-totals';

/**
 * Writes the golden issue: `node --import tsx test/reference/make-golden-issue.ts`, by hand, after `calculatorVersion` was raised. What it is
 * worked from stays as it was first frozen; one version never gets other totals.
 */
function makeGoldenIssue(): void {
  const before = existsSync(goldenIssueFile) ? goldenIssue() : null;
  const draft = () => demonstrationDraft(paintedPlinthJob(), startCard);
  const input = before?.input ?? { draft: draft(), choice: [], card: startCard, currency: 'EUR' };
  const made = { calculatorVersion, input, worked: goldenTotals(input) };
  if (before?.calculatorVersion === calculatorVersion && canonicalJson(before) !== canonicalJson(made))
    throw new Error(`version ${calculatorVersion} gave other totals before: raise calculatorVersion first`);
  writeFileSync(goldenIssueFile, `${canonicalJson(made)}\n`);
}

makeGoldenIssue();
