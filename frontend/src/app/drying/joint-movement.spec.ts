import { inputBinding } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { startTimbers } from '#shared/carving/start-timbers';
import { startDrying } from '#shared/drying/start-drying';
import { signIn, words } from '../../test/sign-in';
import { JointMovement } from './joint-movement';

const shop = { temperature_celsius: 20, humidity_percent: 60 };
const site = { temperature_celsius: 20, humidity_percent: 30 };

describe('JointMovement', () => {
  async function open(from = shop, to = site) {
    TestBed.configureTestingModule({ providers: [words] });
    signIn();
    const fixture = TestBed.createComponent(JointMovement, {
      bindings: [
        inputBinding('timbers', () => startTimbers),
        inputBinding('card', () => startDrying),
        inputBinding('shop', () => from),
        inputBinding('site', () => to),
      ],
    });
    await fixture.whenStable();
    const element = fixture.nativeElement as HTMLElement;
    const text = () =>
      element
        .querySelector('app-figure')
        ?.textContent?.trim()
        .replace(/\u00a0/g, ' ');
    const width = element.querySelector('input') as HTMLInputElement;
    const type = (typed: string) => {
      width.value = typed;
      width.dispatchEvent(new Event('input'));
      return fixture.whenStable();
    };
    return { element, text, type };
  }

  it('says how much narrower a joint gets in a drier room, and that gesso over it will crack', async () => {
    const { element, text } = await open();
    // Wood Handbook: 10.9 % at 20 °C and 60 %, 6.2 % at 30 %; flat-sawn basswood 0.0033 a point on 100 mm, about 1.5 mm.
    expect(Number(/^([\d.]+) mm narrower$/.exec(text() ?? '')?.[1])).toBeCloseTo(1.55, 1);
    expect(element.textContent).toContain('gesso over it will crack');
  });

  it('says wider the other way round, and nothing of a width that cannot be read', async () => {
    const { text, type } = await open(site, shop);
    expect(text()).toMatch(/wider$/);
    await type('wide');
    expect(text()).toBeUndefined();
  });
});
