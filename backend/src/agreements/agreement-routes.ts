import { giveAccess, listAccesses, revokeAccess } from '#shared/agreements/accesses-endpoints';
import { beginVariation, readAcceptedPaper, readAgreement } from '#shared/agreements/agreement-endpoints';
import { answerQuestion, listQuestions } from '#shared/agreements/questions-endpoints';
import { presentSummary } from '../estimates';
import { mount, type Route } from '../platform/http/mount';
import type { AcceptedPaperService } from './accepted-paper-service';
import type { AccessService } from './access-service';
import { presentAccess } from './access-presenter';
import { presentContract } from './contract-presenter';
import { presentDecision } from './decision-presenter';
import { presentQuestion } from './question-presenter';
import type { ContractService } from './contract-service';
import type { QuestionService } from './question-service';
import type { NamedDecisions } from './named-decisions';
import type { VariationService } from './variation-service';

interface Services {
  readonly access: AccessService;
  readonly questions: QuestionService;
  readonly contracts: ContractService;
  readonly named: NamedDecisions;
  readonly papers: AcceptedPaperService;
  readonly variations: VariationService;
}

export const agreementRoutes = ({ access, questions, contracts, named, papers, variations }: Services): Route[] => [
  mount(giveAccess, async ({ actor, params, body }) => {
    const given = await access.give(actor, params.issueId, body);
    return { access: presentAccess(given.access), link: given.link };
  }),
  mount(listAccesses, async ({ actor, params }) => {
    const rows = await access.ofJob(actor.workshopId, params.jobId);
    return { items: rows.map(presentAccess) };
  }),
  mount(revokeAccess, ({ actor, params }) => access.revoke(actor, params.accessId)),
  mount(listQuestions, async ({ actor, params }) => {
    const rows = await questions.ofJob(actor.workshopId, params.jobId);
    return { items: rows.map(presentQuestion) };
  }),
  mount(answerQuestion, async ({ actor, params, body }) =>
    presentQuestion(await questions.answer(actor, params.jobId, body)),
  ),
  mount(readAgreement, async ({ actor, params }) => {
    const decisions = await named.of(await contracts.decisions(actor.workshopId, params.jobId));
    const contract = await contracts.contract(actor.workshopId, params.jobId);
    return {
      contract: contract ? presentContract(contract) : null,
      decisions: decisions.map(presentDecision),
    };
  }),
  mount(readAcceptedPaper, ({ actor, params }) => papers.read(actor.workshopId, params.decisionId)),
  mount(beginVariation, async ({ actor, params, body }) =>
    presentSummary(await variations.begin(actor, params.jobId, body)),
  ),
];
