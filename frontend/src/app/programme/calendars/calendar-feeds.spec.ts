import { Clipboard } from '@angular/cdk/clipboard';
import { TestBed, type ComponentFixture } from '@angular/core/testing';
import type { Role } from '#shared/actor/role';
import { signIn, words } from '../../../test/sign-in';
import { Notices } from '../../core/problems/notices';
import { Confirm } from '../../ui/dialog/confirm';
import { AnsweringForSpecs, buttonIn, refusal, spoken } from '../answering-for-specs';
import { settledForSpecs } from '../settled-for-specs';
import { CalendarFeeds } from './calendar-feeds';

const feed = {
  ...{ id: '018f0000-0000-7000-8000-000000000021', name: 'Office wall', personId: null, madeBy: 'Ora' },
  ...{ madeAt: '2027-01-04T09:00:00.000Z', revokedAt: null, readAt: null },
};
const gina = { id: '018f0000-0000-7000-8000-000000000022', name: 'Gina' };

describe('CalendarFeeds', () => {
  let fixture: ComponentFixture<CalendarFeeds>;
  let server: AnsweringForSpecs;
  let copied: string[];
  const element = () => fixture.nativeElement as HTMLElement;
  const settle = () => settledForSpecs(fixture);
  const press = async (text: string) => {
    buttonIn(element(), text).click();
    await settle();
  };

  interface Opened {
    readonly roles?: readonly Role[];
    readonly isSure?: boolean;
    readonly revoke?: () => unknown;
  }
  async function open({ roles = ['owner'], isSure = true, revoke = () => ({}) }: Opened = {}) {
    copied = [];
    const revoked = { ...feed, id: 'gone', name: 'Taken back', revokedAt: '2027-01-05T09:00:00.000Z' };
    server = new AnsweringForSpecs({
      listFeeds: () => ({ items: [feed, revoked] }),
      readShop: () => ({ content: { people: [gina] } }),
      readBenchDay: () => ({ people: [gina] }),
      makeFeed: ({ body }) => ({ ...feed, ...(body as object), address: '/api/calendar.ics?secret=abc' }),
      revokeFeed: revoke,
    });
    const clipboard = { provide: Clipboard, useValue: { copy: (text: string) => copied.push(text) > 0 } };
    const confirm = { provide: Confirm, useValue: { ask: () => Promise.resolve(isSure) } };
    TestBed.configureTestingModule({ providers: [words, server.provider, clipboard, confirm] });
    signIn(roles);
    fixture = TestBed.createComponent(CalendarFeeds);
    await settle();
  }
  async function name(text: string) {
    const input = element().querySelector('input[formControlName=name]') as HTMLInputElement;
    input.value = text;
    input.dispatchEvent(new Event('input'));
    await settle();
  }

  it('lists what is read, by whom it was made, and nothing that was taken back', async () => {
    await open();
    const items = [...element().querySelectorAll('.feeds li')].map((one) => spoken(one));
    expect(items).toHaveLength(1);
    expect(items[0]).toMatch(/^Office wall ?the whole workshop · made by Ora on .+ · not read yet ?Take it back$/);
  });

  it('makes one, shows its address once, and copies it', async () => {
    await open();
    await name('On the telephone');
    await press('Make the calendar');
    expect(server.of('makeFeed').map(({ body }) => body)).toEqual([{ name: 'On the telephone', personId: null }]);
    await press('Copy it');
    expect(copied).toEqual([`${location.origin}/api/calendar.ics?secret=abc`]);
    await press('Done');
    expect(element().textContent).not.toContain('secret=abc');
    expect(element().querySelector('[aria-label="Secret address"]')).toBeNull();
  });

  it('says beside the entry that a calendar needs a name, and sends nothing', async () => {
    await open();
    await press('Make the calendar');
    expect(spoken(element().querySelector('.complaint'))).not.toBe('');
    expect(server.of('makeFeed')).toEqual([]);
  });

  it('takes one back only once that was confirmed, and says why where it cannot be', async () => {
    await open({ isSure: false });
    await press('Take it back');
    expect(server.of('revokeFeed')).toEqual([]);
    TestBed.resetTestingModule();
    await open({
      revoke: () => {
        throw refusal(403, 'That is another’s calendar.');
      },
    });
    await press('Take it back');
    expect(server.of('revokeFeed').map(({ params }) => params)).toEqual([{ feedId: feed.id }]);
    expect(
      TestBed.inject(Notices)
        .current()
        .map(({ text }) => text),
    ).toEqual(['That is another’s calendar.']);
  });

  it('offers the bench no calendar of the whole workshop', async () => {
    await open({ roles: ['bench'] });
    const options = [...element().querySelectorAll('option')].map((one) => spoken(one));
    expect(options).toEqual(['Gina']);
  });
});
