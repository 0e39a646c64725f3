import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting, type TestRequest } from '@angular/common/http/testing';
import { type ComponentFixture, TestBed } from '@angular/core/testing';
import { provideRouter } from '@angular/router';
import type { ClientIssue } from '#shared/client-page/client-issue-schema';
import type { ClientPrice } from '#shared/client-page/client-price-schema';
import { ClientIssuePage } from '../app/client-page/client-issue-page';
import { SESSION_PORT } from '../app/core/session/session-port';
import { words } from './sign-in';

export const clientId = (number: number): string => `018f0000-0000-7000-8000-0000000003${number}`;
const ids = { issue: clientId(10), job: clientId(11), base: clientId(20), legs: clientId(21) };
/** The alternatives that are offered: two ways of gilding, of which one is chosen, and two things besides. */
export const offered = {
  ...{ oil: clientId(30), silver: clientId(31) },
  ...{ crate: clientId(32), sample: clientId(33) },
} as const;

const workshop: ClientIssue['letterhead'] = {
  ...{ name: 'Mill Yard Carvers', addressLines: ['2 Mill Yard', 'Kilkenny'], telephone: '+353 56 000 0000' },
  ...{ email: 'hello@millyard.example', taxRegistration: '', hasLogo: false },
  ...{ currency: 'EUR', locale: 'en-GB', lengthUnit: 'mm', timeZone: 'Europe/Dublin' },
};

const buildUp = (name: string, leaf: string): ClientIssue['buildUps'][number] => {
  const layer = (stepId: string, colour: 'wood' | 'gesso' | 'leaf') => ({
    ...{ stepId, name: `${name} ${stepId}`, colour, thickness: 1, thickness_mm: null },
    coats: [1, 2] as [number, number],
  });
  return {
    ...{ buildUp: name, zoneIds: [clientId(40)], leaf: [leaf] },
    layers: [layer('wood', 'wood'), layer('gesso', 'gesso'), layer('leaf', 'leaf')],
  };
};

const water = buildUp('Water gilding, burnished', 'Gold 23½ ct');

type Alternative = ClientIssue['alternatives'][number];

const alternative = (
  given: Pick<Alternative, 'id' | 'name' | 'group' | 'difference_minor'> & Partial<Alternative>,
) => ({
  ...{ note: '', gross_minor: 0, weeks: 6, replaces: [], before: [], after: [] },
  ...given,
});

const member = (id: string, name: string): ClientIssue['pieces'][number]['members'][number] => ({
  ...{ id, name, count: 1, timber: 'lime', ornaments: ['Egg and dart'], finishes: ['burnished gold'] },
  shape: { kind: 'rectangle', length_mm: 1200, height_mm: 150 },
  ...{ zoneIds: [], alternativeId: null },
});

export const clientPrice = (gross_minor: number, given: Partial<ClientPrice> = {}): ClientPrice => {
  const tax_minor = 1_150_00;
  const net_minor = gross_minor - tax_minor;
  const line = (id: string, memberId: string, [kind, price_minor]: readonly ['carving' | 'gilding', number]) => ({
    ...{ id, memberId, kind, price_minor, name: null, measured: null },
  });
  return {
    choice: [],
    lines: [
      line('a', ids.base, ['carving', net_minor - 1_000_00]),
      line('b', ids.base, ['gilding', 600_00]),
      line('c', ids.legs, ['gilding', 400_00]),
    ],
    ...{ subtotal_minor: net_minor, discount_minor: 0, discount_percent: null, net_minor, tax_minor, gross_minor },
    taxes: [{ name: 'VAT', code: 'S', percent: '23', exemptionReason: '', net_minor, tax_minor }],
    payments: [
      {
        ...{ of: 'deposit', name: '', share_percent: 40, work_minor: 0 },
        ...{ recovered_minor: 0, retained_minor: 0, paid_minor: 2_460_00 },
      },
    ],
    weeks: 6,
    care: ['care-handling'],
    ...given,
  };
};

/** An issue of 6,150 euros with alternatives, as it arrives. */
export function clientIssue(given: Partial<ClientIssue> = {}): ClientIssue {
  return {
    letterhead: workshop,
    issue: {
      ...{ id: ids.issue, kind: 'estimate', number: '2026-014', letter: 'B', title: 'Pier table', state: 'open' },
      ...{ issuedOn: '2026-03-02', validUntil: '2026-04-30', gross_minor: 6_150_00, currency: 'EUR' },
    },
    replacedBy: null,
    addressee: { name: 'Helena Marsh', contact: '', address: '' },
    job: { id: ids.job, number: '2026-014', title: 'Pier table', reference: '', site: '' },
    ...{ issuedBy: 'Imke Vale', leafValidUntil: null, introduction: '', note: '', included: '', excluded: '' },
    ...{ terms: 'Thirty days.', presentation: 'members' },
    pieces: [{ id: clientId(12), name: 'Base', members: [member(ids.base, 'Frieze'), member(ids.legs, 'Leg')] }],
    buildUps: [water],
    price: clientPrice(6_150_00),
    alternatives: [
      alternative({
        ...{ id: offered.oil, name: 'Oil gilding', group: 'How the frieze is gilded', difference_minor: -615_00 },
        ...{ note: 'Cannot be burnished.', weeks: 4, before: [water], after: [buildUp('Oil gilding', 'Gold 23½ ct')] },
      }),
      alternative({
        ...{ id: offered.silver, name: 'Silver leaf', group: 'How the frieze is gilded', difference_minor: -900_00 },
        ...{ before: [water], after: [buildUp('Oil gilding', 'Silver')] },
      }),
      alternative({ id: offered.crate, name: 'A crate', group: '', difference_minor: 221_40 }),
      alternative({ id: offered.sample, name: 'A sample', group: '', difference_minor: 0, weeks: 7 }),
    ],
    ...{ mayChoose: true, isDrying: true, programme: null, cautions: [], varies: [], questions: [] },
    decision: null,
    ...given,
  };
}

/** The page of an issue in a browser, with the server's side in the test's hand. */
export class ClientVisit {
  private constructor(
    readonly fixture: ComponentFixture<ClientIssuePage>,
    readonly http: HttpTestingController,
  ) {}

  static async begin(issue: ClientIssue = clientIssue()): Promise<ClientVisit> {
    TestBed.configureTestingModule({
      providers: [
        ...[words, provideHttpClient(), provideHttpClientTesting(), provideRouter([])],
        { provide: SESSION_PORT, useValue: { read: () => Promise.resolve() } },
      ],
    });
    // A page that is drawn nowhere has nothing to scroll.
    globalThis.scrollTo = () => undefined;
    const fixture = TestBed.createComponent(ClientIssuePage);
    fixture.componentRef.setInput('issueId', issue.issue.id);
    const visit = new ClientVisit(fixture, TestBed.inject(HttpTestingController));
    await visit.settle();
    visit.http.expectOne(`/api/client/issues/${issue.issue.id}`).flush(issue);
    await visit.until('app-client-issue-rest');
    // What stands further down comes once somebody reads on.
    window.dispatchEvent(new Event('scroll'));
    await visit.until('app-client-thread');
    return visit;
  }

  get element(): HTMLElement {
    return this.fixture.nativeElement as HTMLElement;
  }

  /** All that is read, with single spaces. */
  get text(): string {
    return (this.element.textContent ?? '').replace(/\s+/g, ' ');
  }

  async settle(): Promise<void> {
    TestBed.tick();
    await new Promise((resolve) => setTimeout(resolve));
    TestBed.tick();
  }

  /** Waits for what comes once the page has nothing else to do. */
  async until(selector: string): Promise<void> {
    for (let tries = 0; tries < 50 && !this.element.querySelector(selector); tries++) await this.settle();
    await this.settle();
  }

  button(text: string): HTMLButtonElement | undefined {
    return [...this.element.querySelectorAll('button')].find((one) => one.textContent?.trim() === text);
  }

  async press(text: string): Promise<void> {
    const button = this.button(text);
    if (!button) throw new Error(`there is no button “${text}”`);
    button.click();
    await this.settle();
  }

  /** The box or mark of a choice, by the words beside it. */
  choice(name: string): HTMLInputElement {
    const labels = [...this.element.querySelectorAll('app-client-choices label')];
    const entry = labels
      .find((one) => one.querySelector('.name')?.textContent?.trim() === name)
      ?.querySelector('input');
    if (!entry) throw new Error(`“${name}” is not offered`);
    return entry;
  }

  async choose(name: string): Promise<void> {
    this.choice(name).click();
    await this.settle();
  }

  async enter(name: string, value: string): Promise<void> {
    const entry = this.element.querySelector<HTMLInputElement>(`[formcontrolname=${name}]`);
    if (!entry) throw new Error(`there is no entry “${name}”`);
    if (entry.type === 'checkbox') entry.click();
    else {
      entry.value = value;
      entry.dispatchEvent(new Event('input'));
    }
    await this.settle();
  }

  /** The one request that waits at this address of the issue. */
  asked(path: string): TestRequest {
    return this.http.expectOne(`/api/client/issues/${ids.issue}/${path}`);
  }
}
