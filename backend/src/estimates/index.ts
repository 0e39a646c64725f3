import type { EstimateInput } from '#shared/estimates/estimate-figures';
import type { Figures } from '#shared/estimates/figures';
import type { Accounts } from '../accounts';
import type { Audit } from '../audit';
import type { Jobs } from '../jobs';
import type { Route } from '../platform/http/mount';
import type { Platform } from '../platform/platform';
import type { CardEffects, RateCards } from '../rate-cards';
import { AgreedChoices } from './agreed-choices';
import type { AgreedIssues } from './agreed-issue';
import { cardEffects } from './card-effects';
import { ChangeService } from './change-service';
import type { ContractHolding } from './contract-holding';
import { memberRepository, pieceRepository } from './content-repository';
import { currencyChange } from './currency-change';
import { EstimateRepository } from './estimate-repository';
import { estimateRoutes } from './estimate-routes';
import { EstimateService } from './estimate-service';
import { FrozenIssueService } from './frozen-issue-service';
import type { PaperMaker } from './paper-maker';
import { IssueRepository } from './issue-repository';
import { issueRoutes } from './issue-routes';
import type { FrozenProgramme } from './issue-parts';
import { IssueService } from './issue-service';
import { PaperService } from './paper-service';
import { PresenceRepository } from './presence-repository';
import { PresenceService } from './presence-service';
import { ReadingRepository } from './reading-repository';
import { ReadingService } from './reading-service';
import { RiskDrawing } from './risk-drawing';

export type { BenchSheetRequest, PaperFile, PaperMaker } from './paper-maker';
export type { AgreedIssue } from './agreed-issue';
export type { EstimateService } from './estimate-service';
export type { FrozenIssue, FrozenIssueService, IssuedPaper, IssueOfEstimate } from './frozen-issue-service';
export { presentSummary } from './estimate-presenter';
export type { IssueService } from './issue-service';

export interface Estimates {
  readonly drafts: EstimateService;
  readonly issues: IssueService;
  /** Issues as they were frozen, for whoever reads or accepts them. */
  readonly frozen: FrozenIssueService;
  /** What was agreed on issues: the base, or the alternatives their clients took. */
  readonly choices: AgreedChoices;
  /** What another rate card does to every open estimate. */
  readonly cardEffects: CardEffects;
  /** Any estimate up to its price, drawn for risk only where the price waits for it. */
  readonly priced: (input: EstimateInput) => Promise<Figures>;
  readonly routes: readonly Route[];
}

/** What stands before estimates in the list of features, and what those that stand after supply: the maker of papers, the programme, what was agreed. */
export interface EstimatesNeeds {
  readonly accounts: Accounts;
  readonly audit: Audit;
  readonly rateCards: RateCards;
  readonly jobs: Jobs;
  readonly papers: PaperMaker;
  readonly programme: FrozenProgramme;
  readonly agreed: AgreedIssues;
  readonly mustHold: ContractHolding;
}

/** Estimates: drafts and their issues. */
export function openEstimates({ database, clock, files }: Platform, needs: EstimatesNeeds): Estimates {
  const parts = {
    estimates: new EstimateRepository(database),
    pieces: pieceRepository(database),
    members: memberRepository(database),
    cards: needs.rateCards.service,
    jobs: needs.jobs,
    workshops: needs.accounts.workshops,
    audit: needs.audit.service,
    risks: new RiskDrawing(),
    clock,
  };
  const readings = new ReadingService(new ReadingRepository(database));
  const presences = new PresenceRepository(database);
  const drafts = new EstimateService({ ...parts, presences, readings, changes: new ChangeService(parts) });
  const kept = { ...parts, drafts, issues: new IssueRepository(database), files, papers: needs.papers };
  needs.accounts.workshops.followCurrency(currencyChange(kept));
  const choices = new AgreedChoices({ ...kept, agreed: needs.agreed });
  const frozen = new FrozenIssueService(kept);
  const issues = new IssueService({ ...kept, choices, programme: needs.programme, mustHold: needs.mustHold });
  const papers = new PaperService({ ...kept, choices, frozen });
  const presence = new PresenceService({ ...parts, presences });
  const effects = cardEffects({ drafts, jobs: needs.jobs, cards: needs.rateCards.service, risks: parts.risks });
  const routes = [...estimateRoutes(drafts, presence), ...issueRoutes({ issues, papers, choices })];
  const priced = (input: EstimateInput) => parts.risks.priced(input);
  return { drafts, issues, frozen, choices, cardEffects: effects, priced, routes };
}
