import {
  acceptIssue,
  askClientQuestion,
  declineIssue,
  priceClientChoice,
  readClientIssue,
  readClientLogo,
  readClientOverview,
  readClientPaper,
  reviewClientChoice,
} from '#shared/client-page/client-issues-endpoints';
import type { Accounts } from '../accounts';
import { presentQuestion, type Agreements } from '../agreements';
import { mount, type Route } from '../platform/http/mount';
import { choiceInAddress } from './choice-in-address';
import { presentClientDecision } from './client-issue-presenter';
import type { ClientPageService } from './client-page-service';
import { presentClientPrice } from './client-price-presenter';

type Settled = Pick<Agreements, 'scope' | 'choices' | 'decisions' | 'questions'> & Pick<Accounts, 'throttle'>;

export const clientPageRoutes = (
  pages: ClientPageService,
  { scope, choices, decisions, questions, throttle }: Settled,
): Route[] => [
  mount(readClientOverview, ({ client }) => pages.overview(client)),
  mount(readClientLogo, ({ client }) => pages.logo(client)),
  mount(readClientIssue, ({ client, params }) => pages.issue(client, params.issueId)),
  mount(priceClientChoice, async ({ client, params, body }) => {
    const issue = await scope.issue(client, params.issueId);
    return presentClientPrice(await choices.priced(issue, body.choice));
  }),
  mount(reviewClientChoice, async ({ client, params, body }) => {
    const issue = await scope.issue(client, params.issueId);
    const { chosen, sha256 } = await choices.reviewed(issue, body.choice);
    return { price: presentClientPrice(chosen), pdfSha256: sha256 };
  }),
  mount(readClientPaper, ({ client, params, query }) =>
    pages.paper(client, params.issueId, choiceInAddress(query.choice)),
  ),
  mount(askClientQuestion, async ({ client, params, body, from }) => {
    await throttle.beginQuestion(client, from.address);
    return presentQuestion(await questions.ask(client, params.issueId, body.text));
  }),
  mount(acceptIssue, async ({ client, params, body, from }) => {
    const { agrees: _, ...wish } = body;
    const row = await decisions.accept(client, params.issueId, { ...wish, address: from.address });
    return presentClientDecision(row);
  }),
  mount(declineIssue, async ({ client, params, body, from }) => {
    const row = await decisions.decline(client, params.issueId, { ...body, address: from.address });
    return presentClientDecision(row);
  }),
];
