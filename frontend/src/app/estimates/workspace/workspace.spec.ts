import { type ComponentFixture, TestBed } from '@angular/core/testing';
import { provideRouter, Router } from '@angular/router';
import type { Role } from '#shared/actor/role';
import type { PricedIssueSummary } from '#shared/estimates/issue-schema';
import { EstimateServer, ids, workspaceOn } from '../../../test/estimate-server';
import { signIn, words } from '../../../test/sign-in';
import { estimatesRoutes } from '../estimates-routes';
import type { PresenceAnswer } from '../presence';
import { Workspace } from './workspace';

const issueA = { letter: 'A', net_minor: 100_000 } as PricedIssueSummary;

describe('Workspace', () => {
  let server: EstimateServer;
  let fixture: ComponentFixture<Workspace>;

  const element = () => fixture.nativeElement as HTMLElement;
  const text = (selector: string) =>
    [...element().querySelectorAll(selector)].map((one) => one.textContent?.replace(/\s+/g, ' ').trim());
  const settle = async (time_ms = 10) => {
    await jest.advanceTimersByTimeAsync(time_ms);
    fixture.detectChanges();
  };
  const button = (name: string) =>
    [...element().querySelectorAll('button')].find(
      (one) => one.getAttribute('aria-label') === name || one.textContent?.trim() === name,
    ) as HTMLButtonElement;
  const press = async (key: string, more: KeyboardEventInit = {}) => {
    document.dispatchEvent(new KeyboardEvent('keydown', { key, ctrlKey: true, bubbles: true, ...more }));
    await settle();
  };

  async function open(roles: readonly Role[] = ['estimator']): Promise<void> {
    TestBed.configureTestingModule({
      providers: [
        words,
        provideRouter([{ path: 'jobs/:jobId/estimates', children: estimatesRoutes }]),
        ...workspaceOn(server),
      ],
    });
    signIn(roles);
    fixture = TestBed.createComponent(Workspace);
    fixture.componentRef.setInput('open', { jobId: ids.job, estimateId: ids.estimate });
    await settle();
    await settle();
  }

  const renameEdge = async (name: string) => {
    const store = fixture.componentInstance['store'];
    const { id, ...content } = store.members()[0];
    store.changeMember(id, { ...content, name });
    await settle();
  };
  const firstName = () => fixture.componentInstance['store'].members()[0].name;

  beforeEach(() => {
    jest.useFakeTimers();
    server = new EstimateServer();
  });
  afterEach(() => jest.useRealTimers());

  it('writes money in the currency of the estimate, whatever the workshop’s is', async () => {
    server.currency = 'JPY';
    await open();
    const { net_minor } = fixture.componentInstance['store'].priced()!.price;
    const yen = new Intl.NumberFormat('en-GB', { style: 'currency', currency: 'JPY' }).format(net_minor);
    expect(text('app-tally-bar')[0]).toContain(yen);
    expect(text('app-tally-bar')[0]).not.toContain('€');
  });

  it('names the job, the letter it works toward and every place with its figure', async () => {
    server.issues = () => Promise.resolve([issueA]);
    await open();
    expect(text('h1')).toEqual(['Pier table, paired herons']);
    expect(text('.chip')).toEqual(['working toward issue B']);
    expect(text('app-tally-bar .name')).toEqual(['Measure', 'Carve', 'Gild', 'Dry', 'Price', 'Issue A']);
    // 1000 × 60 mm of edge and two legs of 4 × 700 × 50 mm: 600 + 2 × 1,400 cm², and the slope of the sides.
    expect(text('app-tally-bar .figure')[0]).toBe('3,400 cm²');
    expect(text('app-tally-bar .minor')[0]).toBe('3 members');
  });

  it('works toward nothing once an issue is accepted', async () => {
    server.issues = () => Promise.resolve([{ ...issueA, state: 'accepted' }]);
    await open();
    expect(text('.chip')).toEqual(['issue A accepted']);
  });

  it('shows the bench its places, without price or issue', async () => {
    server.isPriced = false;
    await open(['bench']);
    expect(text('app-tally-bar .name')).toEqual(['Measure', 'Carve', 'Gild', 'Dry']);
    expect(element().textContent).not.toMatch(/€|Issue/);
    expect(button('Undo')).toBeUndefined();
  });

  it('undoes and redoes by keys', async () => {
    await open();
    await renameEdge('Rim');
    await press('z');
    expect(firstName()).toBe('Top edge');
    await press('Z', { shiftKey: true });
    expect(firstName()).toBe('Rim');
  });

  it('offers undo only where there is something to take back', async () => {
    await open();
    expect(button('Undo').disabled).toBe(true);
    await renameEdge('Rim');
    expect([button('Undo').disabled, button('Redo').disabled]).toEqual([false, true]);
    button('Undo').click();
    await settle();
    expect([button('Undo').disabled, button('Redo').disabled]).toEqual([true, false]);
  });

  it('tells who else is at work, and that the card is an old one', async () => {
    const present: PresenceAnswer = { version: 1, others: ['Wim Haas', 'Orla Kinsella'], rateCardInForceId: 'another' };
    (server as { presence: () => Promise<PresenceAnswer> }).presence = () => Promise.resolve(present);
    await open();
    await settle(6000);
    expect(text('app-workspace-news p')[0]).toBe('Wim Haas and Orla Kinsella are at work on this estimate too.');
    expect(text('app-workspace-news span')[0]).toBe('Worked on a rate card that is no longer in force.');
    const link = element().querySelector('app-workspace-news a');
    expect(link?.textContent?.trim()).toBe('See what the newer card changes');
    expect(link?.getAttribute('href')).toBe(`/jobs/${ids.job}/estimates/${ids.estimate}/price?part=card`);
  });

  it('reads again what somebody else changed', async () => {
    await open();
    server.changeElsewhere(ids.edge, { name: 'Cornice' });
    const present: PresenceAnswer = { version: server.version, others: [], rateCardInForceId: ids.card };
    (server as { presence: () => Promise<PresenceAnswer> }).presence = () => Promise.resolve(present);
    await settle(26_000);
    expect(firstName()).toBe('Cornice');
  });

  it('sends what was just typed before one leaves', async () => {
    await open();
    await renameEdge('Rim');
    const kept = fixture.componentInstance.keep();
    await settle();
    await kept;
    expect(server.member(ids.edge)?.name).toBe('Rim');
  });

  it('leads to the place of a member with the member', async () => {
    await open();
    const links = [...element().querySelectorAll('app-tally-bar a')].map((one) => one.getAttribute('href'));
    const place = `/jobs/${ids.job}/estimates/${ids.estimate}`;
    expect(links.slice(1, 4)).toEqual([
      `${place}/carve?member=${ids.edge}`,
      `${place}/gild?member=${ids.edge}`,
      `${place}/dry`,
    ]);
    expect(TestBed.inject(Router).url).toBe('/');
  });
});
