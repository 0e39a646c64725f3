import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { cardParts } from '#shared/rate-cards/tables/card-parts';
import type { Stage } from './stage';

const sources = join(__dirname, '../../frontend/src/app');

/** The files of the sources of the page whose names end so, with their text. */
export const sourceFiles = (...endings: string[]): { readonly path: string; readonly text: string }[] =>
  readdirSync(sources, { recursive: true, encoding: 'utf8' })
    .filter((path) => !path.endsWith('.spec.ts') && endings.some((ending) => path.endsWith(ending)))
    .map((path) => ({ path, text: readFileSync(join(sources, path), 'utf8') }));

/** Every page the addresses of the application lead to, by the name of its component. */
export const pagesOfTheApplication = (): string[] =>
  sourceFiles('-routes.ts').flatMap(({ text }) =>
    [...text.matchAll(/(?:loadComponent: \(\) => \w+\([^)]*\)\s*\.then\(\((?:\{|\) =>)|\bcomponent:) (\w+)/g)].map(
      ([, name]) => name ?? '',
    ),
  );

type AddressesOf = (stage: Stage) => readonly string[];

/** What a stranger opens. */
export const strangerPages: Readonly<Record<string, readonly string[]>> = {
  ClientSignInPage: ['/client/sign-in'],
  SignInPage: ['/sign-in'],
  ForgottenPasswordPage: ['/forgotten-password'],
  NewPasswordPage: ['/new-password', '/new-password#a-secret-of-no-use'],
  NewWorkshopPage: ['/new-workshop'],
  FoundPage: ['/found', '/found#a-secret-of-no-use'],
  JoinPage: [`/join#${'A'.repeat(43)}`],
};

const estimate = ({ sample }: Stage): string => `/jobs/${sample.jobId}/estimates/${sample.estimateId}`;
const place =
  (name: string): AddressesOf =>
  (stage) => [`${estimate(stage)}/${name}`];

const ofMembers =
  (name: string): AddressesOf =>
  (stage) =>
    ['', ...stage.furtherMemberIds.map((id) => `?member=${id}`)].map((query) => `${estimate(stage)}/${name}${query}`);

/** What somebody of a workshop opens. */
export const memberPages: Readonly<Record<string, AddressesOf>> = {
  ChooseWorkshopPage: () => ['/choose-workshop'],
  Shell: () => ['/'],
  NotFoundPage: () => ['/people/nowhere'],
  PeoplePage: () => ['/people'],
  WorkshopPage: () => ['/workshop'],
  ProfilePage: () => ['/profile'],
  LettersPage: () => ['/letters', '/letters?kind=accepted'],
  JobsPage: () => ['/jobs'],
  NewJobPage: () => ['/jobs/new'],
  JobPage: ({ sample, sent }) => [sample, ...sent].map(({ jobId }) => `/jobs/${jobId}`),
  ClientsPage: () => ['/clients'],
  NewClientPage: () => ['/clients/new'],
  ClientPage: ({ jobClientId }) => [`/clients/${jobClientId}`],
  BoardPage: () => ['/programme'],
  ShopPage: () => ['/programme/workshop'],
  CalendarsPage: () => ['/programme/calendars'],
  BenchPage: () => ['/bench'],
  WorkspacePage: (stage) => [estimate(stage)],
  MeasurePage: ofMembers('measure'),
  CarvePage: place('carve'),
  GildPage: ofMembers('gild'),
  DryPage: (stage) => [...place('dry')(stage), ...place('dry?part=programme')(stage)],
  PricePage: (stage) =>
    ['', 'lines', 'profit', 'extras', 'stages', 'alternatives', 'card'].map(
      (part) => `${estimate(stage)}/price${part && `?part=${part}`}`,
    ),
  IssuePage: place('issue'),
  IssueViewPage: ({ issued, sent }) =>
    [issued, ...sent].map(
      ({ jobId, estimateId, issueId }) => `/jobs/${jobId}/estimates/${estimateId}/issue/${issueId}`,
    ),
  SheetsPage: place('sheets'),
  AccountsPage: () => ['/accounts'],
  OwedPage: () => ['/accounts'],
  InvoicesPage: () => ['/accounts/invoices', '/accounts/invoices?show=drafts'],
  PaymentsPage: () => ['/accounts/payments'],
  DueStagesPage: () => ['/accounts/due'],
  JournalPage: () => ['/accounts/journal?from=2020-01-01&to=2099-12-31'],
  InvoiceSettingsPage: () => ['/accounts/settings'],
  NewInvoicePage: () => ['/accounts/invoices/new'],
  InvoicePage: ({ books }) => [books.draftId, books.issuedId].map((id) => `/accounts/invoices/${id}`),
  NewPaymentPage: ({ books }) => [`/accounts/payments/new?client=${books.clientId}`],
  StatementPage: ({ books }) => [`/accounts/clients/${books.clientId}`],
  CardsPage: () => ['/rates'],
  CardPage: ({ rateCardId }) => [`/rates/${rateCardId}`],
  ChangesPage: ({ rateCardId }) => [`/rates/${rateCardId}/changes`],
  BuildUpsPage: ({ rateCardId }) => [`/rates/${rateCardId}/build-ups`],
  CardPartPage: ({ rateCardId }) =>
    cardParts
      .map(({ id }) => id)
      .filter((id) => id !== 'build-ups')
      .map((id) => `/rates/${rateCardId}/${id}`),
};

/** What a client opens, beginning with the link they were sent. */
export const clientPages: Readonly<Record<string, AddressesOf>> = {
  ClientVisitPage: ({ sent }) => sent.map(({ token }) => `/client#${token}`),
  ClientOverviewPage: () => ['/client/papers'],
  ClientIssuePage: ({ sent }) => sent.slice(-1).map(({ issueId }) => `/client/issues/${issueId}`),
  ClientInvoicePage: ({ books }) => [`/client/invoices/${books.sentId}`],
  ClientPaymentPage: ({ books }) => [`/client/payments/${books.checkoutId}`],
};
