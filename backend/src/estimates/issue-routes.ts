import {
  issueEstimate,
  listIssues,
  markIssue,
  readBenchSheet,
  readDifferences,
  readIssue,
  readPaper,
} from '#shared/estimates/issues-endpoints';
import { mount, type Route } from '../platform/http/mount';
import type { AgreedChoices } from './agreed-choices';
import { presentIssue } from './issue-presenter';
import type { IssueService } from './issue-service';
import type { PaperService } from './paper-service';

interface Services {
  readonly issues: IssueService;
  readonly papers: PaperService;
  readonly choices: AgreedChoices;
}

export const issueRoutes = ({ issues, papers, choices }: Services): Route[] => [
  mount(listIssues, async ({ actor, params }) => {
    const rows = await issues.ofEstimate(actor.workshopId, params.estimateId);
    return { items: await choices.shown(actor.workshopId, rows) };
  }),
  mount(issueEstimate, async ({ actor, params, body }) =>
    presentIssue(await issues.issue(actor, params.estimateId, body)),
  ),
  mount(readDifferences, ({ actor, params }) => issues.differences(actor.workshopId, params.estimateId)),
  mount(readIssue, ({ actor, params }) => issues.read(actor, params.issueId)),
  mount(markIssue, async ({ actor, params, body }) => presentIssue(await issues.mark(actor, params.issueId, body))),
  mount(readPaper, ({ actor, params }) => papers.paper(actor, params.issueId, params.paper)),
  mount(readBenchSheet, ({ actor, params }) => papers.benchSheet(actor.workshopId, params.estimateId, params.pieceId)),
];
