import { ChangeDetectionStrategy, Component } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import * as z from 'zod';
import { layingWays } from '#shared/leaf/leaf-card';
import { laysLaying } from '#shared/leaf/lays-laying';
import { signIn, words } from '../../test/sign-in';
import { documentForm } from '../core/forms/document-form';
import { LayingForm } from './laying-form';
import { laidAs } from './laying-names';

const layingSchema = z.strictObject({
  laying: z.strictObject({
    way: z.enum(['proposed', ...layingWays]),
    strips: z.int().nullable(),
    cuts: z.int().nullable(),
  }),
});

const ovolo = laysLaying(
  { girth_mm: 47.1, run_mm: 2860, closedRun: false },
  { side_mm: 80, lap_mm: 3.2 },
  { strips: null, fewestStrips: 2, leafCost: 2.08, pieceCost: 0.44 },
);

@Component({
  selector: 'app-test-laying',
  imports: [LayingForm],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `<app-laying-form path="laying" [form]="form" [laid]="laid" [options]="options" [perZone]="1.35" />`,
})
class TestLaying {
  readonly form = documentForm(layingSchema);
  readonly laid = { way: 'lays', strips: ovolo.chosen.strips, cuts: null } as const;
  readonly options = ovolo.options;
}

describe('LayingForm', () => {
  async function open() {
    TestBed.configureTestingModule({ providers: [words] });
    signIn();
    const fixture = TestBed.createComponent(TestLaying);
    const { form } = fixture.componentInstance;
    const document = { laying: { way: 'proposed', strips: null, cuts: null } };
    form.reset(document);
    await fixture.whenStable();
    return { fixture, form, element: fixture.nativeElement as HTMLElement };
  }

  it('says what the shape proposes, and every number of strips with what it takes', async () => {
    const { element } = await open();
    expect(element.querySelector('option')?.textContent).toBe('proposed: lays, 3 strips');
    const rows = [...element.querySelectorAll('tbody tr')].map((row) =>
      [...row.querySelectorAll('td')].slice(1).map((cell) => cell.textContent?.trim().replace(/\u00a0/g, ' ')),
    );
    expect(rows).toHaveLength(8);
    // Three strips of 26.7 mm: 2 lays of 38 pieces, 25.3 leaves a member, 34.2 with a relief of 1.35.
    expect(rows[2]?.slice(0, 3)).toEqual(['26.7 mm', '2 × 38', '34.2']);
  });

  it('takes other strips, and the cheapest again', async () => {
    const { element, form, fixture } = await open();
    const radios = element.querySelectorAll<HTMLInputElement>('input[type="radio"]');
    radios[4]?.click();
    await fixture.whenStable();
    expect(form.parsed()?.laying).toEqual({ way: 'proposed', strips: 4, cuts: null });
    radios[0]?.click();
    await fixture.whenStable();
    expect(form.parsed()?.laying.strips).toBeNull();
  });

  it('forgets strips and cuts with another way', async () => {
    const { element, form, fixture } = await open();
    form.put('laying.strips', 4);
    const select = element.querySelector('select') as HTMLSelectElement;
    select.value = 'patches';
    select.dispatchEvent(new Event('change'));
    await fixture.whenStable();
    expect(form.parsed()?.laying).toEqual({ way: 'patches', strips: null, cuts: null });
  });

  it.each([
    [{ way: 'lays', strips: 3, cuts: null } as const, 'lays, 3 strips'],
    [{ way: 'lays', strips: 1, cuts: null } as const, 'lays, whole leaf'],
    [{ way: 'patches', strips: null, cuts: 2 } as const, 'patches, 2 by 2'],
    [{ way: 'sheets', strips: null, cuts: null } as const, 'sheets'],
  ])('names a way of laying: %o', (laid, text) => {
    expect(laidAs(laid)).toBe(text);
  });
});
