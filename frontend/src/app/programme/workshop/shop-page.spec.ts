import { TestBed, type ComponentFixture } from '@angular/core/testing';
import { provideRouter } from '@angular/router';
import type { ShopContent } from '#shared/programme/shop-schema';
import { signIn, words } from '../../../test/sign-in';
import { Notices } from '../../core/problems/notices';
import { AnsweringForSpecs, type AskedParts, buttonIn, refusal, spoken } from '../answering-for-specs';
import { shopForSpecs } from './shop-for-specs';
import { ShopPage } from './shop-page';

const known = {
  grades: [
    { id: 'gilder', name: 'Gilder' },
    { id: 'carver', name: 'Carver' },
  ],
  memberships: [],
};
const shop = shopForSpecs();
const withRack = (change: object): ShopContent => ({
  ...shop,
  places: shop.places.map((one) => ({ ...one, ...change })),
});

describe('ShopPage', () => {
  let fixture: ComponentFixture<ShopPage>;
  let server: AnsweringForSpecs;
  const element = () => fixture.nativeElement as HTMLElement;
  const settle = async () => {
    await fixture.whenStable();
    TestBed.tick();
    await fixture.whenStable();
  };
  const kept = ({ body, version }: AskedParts) => ({ ...known, version: (version ?? 0) + 1, content: body });

  async function open(keepShop: (parts: AskedParts) => unknown = kept, version = 3) {
    server = new AnsweringForSpecs({ readShop: () => ({ ...known, version, content: shop }), keepShop });
    TestBed.configureTestingModule({ providers: [words, provideRouter([]), server.provider] });
    signIn(['owner']);
    fixture = TestBed.createComponent(ShopPage);
    await settle();
  }

  function entry(label: string, within = element()): HTMLInputElement {
    const found = [...within.querySelectorAll('app-field')].find((one) => spoken(one.querySelector('label')) === label);
    return found?.querySelector('input, select') as HTMLInputElement;
  }
  async function type(label: string, text: string) {
    const input = entry(label);
    input.value = text;
    input.dispatchEvent(new Event('change'));
    await settle();
  }
  async function keep() {
    buttonIn(element(), 'Keep it').click();
    await settle();
  }
  const told = () =>
    TestBed.inject(Notices)
      .current()
      .map(({ text }) => text);

  it('keeps how many places a rack has, decided on the version that was read', async () => {
    await open();
    await type('How many', '6');
    await keep();
    const [{ version, body }] = server.of('keepShop');
    expect([version, (body as ShopContent).places[0].capacity]).toEqual([3, 6]);
    expect(spoken(element())).not.toContain('not kept yet');
  });

  it('adds a bench to carve at', async () => {
    await open();
    buttonIn(element(), 'Add a rack or a bench').click();
    await settle();
    const line = [...element().querySelectorAll('app-shop-places > .line')][1] as HTMLElement;
    const [name, kind] = [entry('Name', line), entry('What it is', line)];
    name.value = 'Vice bench';
    name.dispatchEvent(new Event('change'));
    kind.value = 'bench';
    kind.dispatchEvent(new Event('change'));
    await settle();
    await keep();
    const [{ body }] = server.of('keepShop');
    expect((body as ShopContent).places[1]).toMatchObject({ name: 'Vice bench', kind: 'bench', capacity: 1 });
  });

  it('sends nothing that is wrong, and says what is beside its entry', async () => {
    await open();
    await type('How many', '0');
    await keep();
    expect(server.of('keepShop')).toEqual([]);
    const field = entry('How many').closest('app-field');
    expect(spoken(field?.querySelector('.complaint'))).toBe('Must be at least 1.');
  });

  it('says that what stands is assumed, as long as nothing was entered', async () => {
    await open(kept, 0);
    expect(spoken(element())).toContain('Nothing was entered yet.');
  });

  it('lays two people’s changes together, where they changed other lines', async () => {
    const theirs = { version: 4, content: withRack({ name: 'Tall rack' }) };
    await open((parts) => {
      if (parts.version === 3) throw refusal(412, 'Somebody was faster.', { current: theirs });
      return kept(parts);
    });
    await type('How many', '6');
    await keep();
    const [, { version, body }] = server.of('keepShop');
    expect([version, (body as ShopContent).places[0]]).toMatchObject([4, { name: 'Tall rack', capacity: 6 }]);
    expect(told().join()).toContain('theirs and yours both stand');
  });

  it('shows both sides of a line both changed, and keeps the one that is chosen', async () => {
    const theirs = { version: 4, content: withRack({ capacity: 9 }) };
    await open((parts) => {
      if (parts.version === 3) throw refusal(412, 'Somebody was faster.', { current: theirs });
      return kept(parts);
    });
    await type('How many', '6');
    await keep();
    const sides = element().querySelector('app-two-sides') as HTMLElement;
    expect(spoken(sides)).toContain('Racks and benches, Long rack, How many');
    expect([...sides.querySelectorAll('dd')].map(spoken)).toEqual(['kept now: 9', 'yours: 6']);
    buttonIn(sides, 'Keep mine').click();
    await settle();
    const [, { version, body }] = server.of('keepShop');
    expect([version, (body as ShopContent).places[0].capacity]).toEqual([4, 6]);
  });

  it('takes what is kept now without sending anything', async () => {
    const theirs = { version: 4, content: withRack({ capacity: 9 }) };
    await open(() => {
      throw refusal(412, 'Somebody was faster.', { current: theirs });
    });
    await type('How many', '6');
    await keep();
    buttonIn(element(), 'Take what is kept now').click();
    await settle();
    expect([server.of('keepShop').length, entry('How many').value]).toEqual([1, '9']);
    expect(spoken(element())).not.toContain('not kept yet');
  });
});
