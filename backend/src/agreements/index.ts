import type { Accounts } from '../accounts';
import type { Audit } from '../audit';
import type { Estimates } from '../estimates';
import type { Jobs } from '../jobs';
import { ownOrigin } from '../platform/config/own-origin';
import type { Route } from '../platform/http/mount';
import type { Platform } from '../platform/platform';
import { AcceptedPaperService } from './accepted-paper-service';
import { AccessService } from './access-service';
import { agreementRoutes } from './agreement-routes';
import { ChoiceService } from './choice-service';
import { ClientAccessRepository } from './client-access-repository';
import { ClientScope } from './client-scope';
import { ContractService } from './contract-service';
import { DecisionLetters } from './decision-letters';
import { DecisionRepository } from './decision-repository';
import { DecisionService } from './decision-service';
import { letterRoutes } from './letter-routes';
import { LetterService } from './letter-service';
import { LetterTemplateRepository } from './letter-template-repository';
import { LetterTemplateService } from './letter-template-service';
import { NamedDecisions } from './named-decisions';
import { QuestionRepository } from './question-repository';
import { QuestionService } from './question-service';
import { SignInService } from './sign-in-service';
import { VariationService } from './variation-service';
import { VisitService } from './visit-service';

export type { AcceptedPaperService } from './accepted-paper-service';
export type { AccessService } from './access-service';
export { presentQuestion } from './question-presenter';
export type { ChoiceService } from './choice-service';
export type { ClientIssueRows, ClientScope } from './client-scope';
export type { ContractService } from './contract-service';
export type { DecisionRow } from './decision-model';
export type { DecisionService } from './decision-service';
export type { LetterFigures } from './letter-figures';
export type { ClientLetter, LetterService } from './letter-service';
export type { LetterTemplateService } from './letter-template-service';
export type { QuestionRow } from './question-model';
export type { QuestionService } from './question-service';
export type { SignInService } from './sign-in-service';
export type { VariationService } from './variation-service';
export type { VisitService } from './visit-service';

export interface Agreements {
  readonly access: AccessService;
  readonly visits: VisitService;
  readonly signIns: SignInService;
  /** What a client may see. */
  readonly scope: ClientScope;
  readonly choices: ChoiceService;
  readonly decisions: DecisionService;
  readonly papers: AcceptedPaperService;
  readonly questions: QuestionService;
  readonly contracts: ContractService;
  readonly variations: VariationService;
  readonly letters: LetterService;
  readonly templates: LetterTemplateService;
  readonly routes: readonly Route[];
}

/** What this feature stands on. */
export interface AgreementsNeeds {
  readonly accounts: Accounts;
  readonly audit: Audit;
  readonly jobs: Jobs;
  readonly estimates: Estimates;
}

function openLetters({ database, mailbox }: Platform, { accounts, audit }: AgreementsNeeds) {
  const templates = new LetterTemplateService({
    templates: new LetterTemplateRepository(database),
    audit: audit.service,
  });
  return { templates, letters: new LetterService({ templates, accounts, mailbox }) };
}

function openDecisions(
  platform: Platform,
  needs: AgreementsNeeds,
  { letters, accesses }: { letters: LetterService; accesses: ClientAccessRepository },
) {
  const { estimates, jobs, accounts } = needs;
  const decisions = new DecisionRepository(platform.database);
  const { frozen } = estimates;
  const base = { ...platform, estimates, jobs, frozen, decisions, workshops: accounts.workshops };
  const scope = new ClientScope({ ...base, accesses });
  const choices = new ChoiceService(frozen);
  const contracts = new ContractService(base);
  const told = new DecisionLetters({ ...base, letters, origin: ownOrigin(platform.config) });
  return {
    scope,
    choices,
    contracts,
    papers: new AcceptedPaperService(base),
    decisions: new DecisionService({ ...base, scope, choices, letters: told }),
    variations: new VariationService({ ...base, contracts }),
  };
}

/** What a workshop and its client settle: ways in, questions, decisions, contracts, variations, and the letters about them. */
export function openAgreements(platform: Platform, needs: AgreementsNeeds): Agreements {
  const { accounts, audit, jobs, estimates } = needs;
  const { templates, letters } = openLetters(platform, needs);
  const accesses = new ClientAccessRepository(platform.database);
  const decided = openDecisions(platform, needs, { letters, accesses });
  const told = { ...platform, jobs, letters, audit: audit.service, origin: ownOrigin(platform.config) };
  const access = new AccessService({ ...told, accesses, estimates, workshops: accounts.workshops });
  const questions = new QuestionService({
    ...told,
    questions: new QuestionRepository(platform.database),
    scope: decided.scope,
    frozen: estimates.frozen,
  });
  return {
    ...decided,
    ...{ access, questions, letters, templates },
    visits: new VisitService({ ...told, accesses }),
    signIns: new SignInService({ ...told, accesses, access, accounts }),
    routes: [
      ...agreementRoutes({ ...decided, access, questions, named: new NamedDecisions(estimates.frozen) }),
      ...letterRoutes(letters, templates),
    ],
  };
}
