import { ChangeDetectionStrategy, Component } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { provideRouter } from '@angular/router';
import { RouterTestingHarness } from '@angular/router/testing';
import { TallyBar } from './tally-bar';
import type { TallyCell } from './tally-cell';

const cells: readonly TallyCell[] = [
  { name: 'Measure', figure: '2.69 m²', minor: '37 members', route: '/measure' },
  { name: 'Price', figure: '€23,320', minor: '18% margin', route: '/price', isPending: true },
];

@Component({
  selector: 'app-test-place',
  imports: [TallyBar],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `<app-tally-bar [cells]="cells" />`,
})
class TestPlace {
  readonly cells = cells;
}

describe('TallyBar', () => {
  it('marks the open place, and what is still being worked out', async () => {
    TestBed.configureTestingModule({ providers: [provideRouter([{ path: ':place', component: TestPlace }])] });
    const harness = await RouterTestingHarness.create('/price');
    const links = [...(harness.routeNativeElement?.querySelectorAll('a') ?? [])];
    await harness.fixture.whenStable();
    expect(links.map((link) => link.getAttribute('aria-current'))).toEqual([null, 'page']);
    expect(links.map((link) => link.querySelector('.figures')?.getAttribute('aria-busy'))).toEqual([null, 'true']);
    expect(links[0].textContent?.replace(/\s+/g, ' ').trim()).toBe('Measure 2.69 m² 37 members');
  });
});
