import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import { FreshPage } from '../../core/routing/fresh-page';
import { Formats } from '../../core/formats/formats';
import { EstimateStore } from '../estimate-store';

/** What one should know while at work: who else is here, that the card is an old one, that the page is. */
@Component({
  selector: 'app-workspace-news',
  imports: [MatButton, RouterLink],
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { role: 'status', class: 'no-print' },
  template: `
    @if (store.isOutdated()) {
      <p>
        <span i18n>The server works with newer calculators than this page.</span>
        <button matButton type="button" (click)="reload()" i18n>Reload the page</button>
      </p>
    }
    @if (others(); as names) {
      <p i18n>{{ names }} at work on this estimate too.</p>
    }
    @if (store.mayEdit() && store.isCardOld()) {
      <p>
        <span i18n>Worked on a rate card that is no longer in force.</span>
        <a matButton [routerLink]="comparison()" [queryParams]="{ part: 'card' }" i18n
          >See what the newer card changes</a
        >
      </p>
    }
  `,
  styles: `
    p {
      display: flex;
      flex-wrap: wrap;
      gap: 0 12px;
      align-items: center;
      max-width: none;
      min-height: 40px;
      padding: 0 28px;
      border-bottom: 1px solid var(--line);
      background: var(--tint);
      font-size: 0.9375rem;
    }

    @media (max-width: 640px) {
      p {
        padding: 4px 16px;
      }
    }
  `,
})
export class WorkspaceNews {
  private readonly formats = inject(Formats);
  private readonly freshPage = inject(FreshPage);
  protected readonly store = inject(EstimateStore);

  /** The price place, where the two cards stand side by side before one is taken. */
  protected readonly comparison = computed(() => {
    const opened = this.store.ids();
    return ['/jobs', opened?.jobId, 'estimates', opened?.estimateId, 'price'];
  });
  protected readonly others = computed(() => {
    const names = this.store.others();
    if (names.length === 0) return '';
    const list = new Intl.ListFormat(this.formats.locale(), { type: 'conjunction' }).format(names);
    return names.length === 1 ? $localize`${list}:name: is` : $localize`${list}:names: are`;
  });

  protected async reload(): Promise<void> {
    if (await this.store.flush()) this.freshPage.open(location.pathname + location.search);
  }
}
