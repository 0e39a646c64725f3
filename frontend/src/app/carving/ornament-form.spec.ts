import { ChangeDetectionStrategy, Component } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import * as z from 'zod';
import { ornamentUseSchema } from '#shared/carving/ornament-use-schema';
import type { OrnamentUse } from '#shared/carving/ornament-use';
import { startCarving } from '#shared/carving/start-carving';
import { signIn, words } from '../../test/sign-in';
import { documentForm } from '../core/forms/document-form';
import { ornamentCatalogue } from './ornament-catalogue';
import { OrnamentForm } from './ornament-form';

const catalogue = ornamentCatalogue(startCarving);
const use: OrnamentUse = {
  id: '018f0000-0000-7000-8000-000000000001',
  ornamentId: 'egg-and-dart',
  extent: { way: 'run', run_mm: 2860, runs: 1, mitreLeaf_mm: 0, mitreLeaves: 0, centre_mm: null },
  size_mm: null,
  relief: 'middle',
  isUndercut: false,
  plan: 'straight',
  isMirrored: false,
  joinsLearning: false,
  hasOwnPattern: false,
  zoneId: null,
};

@Component({
  selector: 'app-test-ornament',
  imports: [OrnamentForm],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `<app-ornament-form path="use" [form]="form" [catalogue]="catalogue" [memberRun_mm]="2860" />`,
})
class TestOrnament {
  readonly catalogue = catalogue;
  readonly form = documentForm(z.strictObject({ use: ornamentUseSchema }));
}

describe('OrnamentForm', () => {
  async function open() {
    TestBed.configureTestingModule({ providers: [words] });
    signIn();
    const fixture = TestBed.createComponent(TestOrnament);
    const { form } = fixture.componentInstance;
    const document = { use };
    form.reset(document);
    await fixture.whenStable();
    const element = fixture.nativeElement as HTMLElement;
    const labels = () =>
      [...element.querySelectorAll('label')].map((label) => label.textContent?.trim().split(/\s{2,}/)[0]);
    const entry = (label: string) => {
      const found = [...element.querySelectorAll('label')].find((one) => one.textContent?.trim().startsWith(label));
      return (found?.querySelector('input') ?? document_(found?.htmlFor)) as HTMLInputElement;
    };
    const document_ = (id = '') => element.querySelector(`#${id}`);
    const offer = () => element.querySelector('.other') ?? undefined;
    return { fixture, form, labels, entry, offer };
  }

  it('takes a run with all it has, and gives plain millimetres', async () => {
    const { form, labels, entry, fixture } = await open();
    expect(labels()).toEqual(
      expect.arrayContaining([
        'Length of a run',
        'Runs on one member',
        'Mitre leaves on a run',
        'Centrepiece optional',
      ]),
    );
    const centre = entry('Centrepiece');
    centre.value = '6 cm';
    centre.dispatchEvent(new Event('input'));
    await fixture.whenStable();
    expect(form.parsed()?.use.extent).toMatchObject({ run_mm: 2860, centre_mm: 60 });
  });

  it('offers the run of the member where the ornament’s is another, and leaves what is meant in peace', async () => {
    const { form, offer, fixture } = await open();
    expect(offer()).toBeUndefined();
    form.put('use.extent.run_mm', 1900);
    await fixture.whenStable();
    expect(offer()?.querySelector('span')?.textContent).toMatch(/^The member’s run is 2860\smm\.$/);
    offer()?.querySelector('button')?.click();
    await fixture.whenStable();
    expect(form.parsed()?.use.extent).toMatchObject({ run_mm: 2860 });
    expect(offer()).toBeUndefined();
    // Flutes side by side have a length of their own.
    form.put('use.extent', { ...use.extent, run_mm: 440, runs: 12 });
    await fixture.whenStable();
    expect(offer()).toBeUndefined();
  });

  it('asks of work done once neither relief nor size nor plan', async () => {
    const { form, labels, fixture } = await open();
    form.put('use', { ...use, ornamentId: 'clay-model', extent: { way: 'pieces', count: 1 } });
    await fixture.whenStable();
    expect(labels()).not.toContain('Relief');
    expect(labels()).not.toContain('On plan');
    expect(labels()).toContain('Pieces on one member');
  });

  it('asks whether a second hand is learnt with the first only where it is one', async () => {
    const { labels, entry, fixture } = await open();
    expect(labels()).not.toContain('Learnt together with the first hand');
    entry('The other hand of a pair').click();
    await fixture.whenStable();
    expect(labels()).toContain('Learnt together with the first hand');
  });

  it('says what is wrong where mitre leaves fill the run', async () => {
    const { form, fixture } = await open();
    form.put('use.extent.mitreLeaves', 100);
    form.put('use.extent.mitreLeaf_mm', 50);
    await fixture.whenStable();
    expect(form.parsed()).toBeUndefined();
    expect(form.message('use.extent.run_mm')).toBe('The mitre leaves and the centrepiece are longer than the run.');
  });
});
