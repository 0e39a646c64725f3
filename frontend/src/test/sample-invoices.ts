import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import type { Type } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { provideRouter, withComponentInputBinding } from '@angular/router';
import { RouterTestingHarness } from '@angular/router/testing';
import type { Role } from '#shared/actor/role';
import type { Invoice, InvoiceSummary } from '#shared/invoices/invoice-schema';
import { SESSION_PORT } from '../app/core/session/session-port';
import { Confirm } from '../app/ui/dialog/confirm';
import type { WorkshopFacts } from '../app/core/session/session-facts';
import { signIn, words } from './sign-in';

export const invoiceId = (number: number): string => `018f0000-0000-7000-8000-0000000002${number}`;

/** 2 h at 80.00 and a lump of 40.00, taxed at 23 %: 200.00, 46.00, 246.00. */
export const sampleSummary = (more: Partial<InvoiceSummary> = {}): InvoiceSummary => ({
  ...{ id: invoiceId(10), version: 3, kind: 'invoice', state: 'issued', number: '2026-0007' },
  ...{ clientId: invoiceId(90), clientName: 'Ashgrove House', jobId: null, creditedInvoiceId: null, currency: 'EUR' },
  ...{ issuedOn: '2026-03-02', dueOn: '2026-03-16', isOverdue: false },
  ...{ net_minor: 200_00, tax_minor: 46_00, gross_minor: 246_00, due_minor: 246_00, open_minor: 246_00 },
  credited_minor: 0,
  ...more,
});

const tax = { code: 'S', percent: '23' } as const;
const line = { description: '', baseQuantity: '1', allowancesCharges: [], tax };

export const sampleInvoice = (more: Partial<Invoice> = {}): Invoice => ({
  ...sampleSummary(),
  content: {
    ...{ clientId: invoiceId(90), jobId: null, pricesHold: 'net', allowancesCharges: [], exemptions: [] },
    buyer: {
      ...{ name: 'Ashgrove House', contact: '', address: '1 Long Walk\nDublin', country: 'IE', vatId: '' },
      ...{ companyNumber: '', email: 'house@ashgrove.example', reference: '' },
    },
    lines: [
      { ...line, id: 'line-1', name: 'Cleaning', quantity: '2', unit: 'HUR', price: '80.00' },
      { ...line, id: 'line-2', name: 'Collection', quantity: '1', unit: 'C62', price: '40.00' },
    ],
    ...{ deliveredOn: null, period: null, dueOn: null, terms: '', roundsToCash: false, note: '' },
  },
  ...{ claim: null, rounding_minor: 0, findings: [], writeOffs: [], letters: [], mailsTo: 'house@ashgrove.example' },
  ...{ sha256: 'ab'.repeat(32), papers: ['invoice.pdf', 'invoice.xml'] },
  totals: {
    ...{ lineNets_minor: [160_00, 40_00], lineSum_minor: 200_00, allowances_minor: 0, charges_minor: 0 },
    categories: [{ tax, net_minor: 200_00, tax_minor: 46_00 }],
    ...{ net_minor: 200_00, tax_minor: 46_00, gross_minor: 246_00, due_minor: 246_00 },
  },
  ...more,
});

/** A draft of it, as the server has it before it was issued. */
export const sampleDraft = (more: Partial<Invoice> = {}): Invoice =>
  sampleInvoice({
    ...{ state: 'draft', number: null, issuedOn: null, dueOn: null, open_minor: 0, sha256: null, papers: [] },
    ...more,
  });

export const pageOf = <T>(items: readonly T[]) => ({ items, next: null, count: items.length, countIsExact: true });

interface Question {
  readonly text: string;
  readonly yes: string;
}

interface Visiting {
  readonly path: string;
  readonly address: string;
  readonly roles?: readonly Role[];
  readonly settings?: Partial<WorkshopFacts>;
}

/** One page of accounts under its address, with what it asks the server for in one's own hands. */
export class BooksVisit {
  private readonly http = TestBed.inject(HttpTestingController);

  private constructor(
    private readonly harness: RouterTestingHarness,
    /** What was asked before something that cannot be undone; answered with yes. */
    readonly questions: readonly Question[],
  ) {}

  static async begin(page: Type<unknown>, at: Visiting) {
    const questions: Question[] = [];
    const confirm = { ask: (question: Question) => (questions.push(question), Promise.resolve(true)) };
    TestBed.configureTestingModule({
      providers: [
        ...[words, provideHttpClient(), provideHttpClientTesting(), { provide: SESSION_PORT, useValue: {} }],
        { provide: Confirm, useValue: confirm },
        provideRouter(
          [
            { path: at.path, component: page },
            { path: '**', children: [] },
          ],
          withComponentInputBinding(),
        ),
      ],
    });
    signIn(at.roles ?? ['office'], at.settings);
    const visit = new BooksVisit(await RouterTestingHarness.create(at.address), questions);
    await visit.settle();
    return visit;
  }

  get element(): HTMLElement {
    return this.harness.fixture.nativeElement as HTMLElement;
  }

  get text(): string {
    return (this.element.textContent ?? '').replace(/\s+/g, ' ');
  }

  async settle(wait_ms = 0): Promise<void> {
    await new Promise((resolve) => setTimeout(resolve, wait_ms));
    TestBed.tick();
  }

  button(text: string): HTMLButtonElement | undefined {
    return [...this.element.querySelectorAll('button')].find(
      (one) => one.textContent?.replace(/\s+/g, ' ').trim() === text,
    );
  }

  async press(text: string): Promise<void> {
    const button = this.button(text);
    if (!button) throw new Error(`no button “${text}”`);
    button.click();
    await this.settle();
  }

  /** The entry with this label. */
  entry(label: string, place = 0): HTMLInputElement {
    const labels = [...this.element.querySelectorAll('label')].filter(
      (one) =>
        one.textContent
          ?.replace(/\s+/g, ' ')
          .trim()
          .replace(/ optional$/, '') === label,
    );
    const entry = this.element.querySelector<HTMLInputElement>(`#${labels[place]?.htmlFor}`);
    if (!entry) throw new Error(`no entry “${label}”`);
    return entry;
  }

  async type(label: string, text: string, place = 0): Promise<void> {
    const entry = this.entry(label, place);
    entry.value = text;
    entry.dispatchEvent(new Event('input'));
    await this.settle();
  }

  /** The one request to this address, with what it carries. */
  request(method: string, address: string) {
    return this.http.expectOne((one) => one.method === method && one.urlWithParams.split('?')[0] === address);
  }

  async answer(method: string, address: string, body: unknown): Promise<void> {
    this.request(method, address).flush(body as object);
    await this.settle();
  }

  /** The server says no to it. */
  async refuse(
    method: string,
    address: string,
    problem: object & { readonly status: number; readonly current?: unknown },
  ): Promise<void> {
    this.request(method, address).flush(problem, { status: problem.status, statusText: 'refused' });
    await this.settle();
  }

  /** Requests to this address that wait. */
  waiting(method: string, address: string) {
    return this.http.match((one) => one.method === method && one.urlWithParams.split('?')[0] === address);
  }
}
