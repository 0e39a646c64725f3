import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { EmptyState } from '../ui/page/empty-state';
import { PageHeader } from '../ui/page/page-header';
import { Skeleton } from '../ui/page/skeleton';
import { LogoEntry } from './logo-entry';
import { WorkshopForm } from './workshop-form';
import { WorkshopStore } from './workshop-store';

@Component({
  selector: 'app-workshop-page',
  imports: [EmptyState, LogoEntry, MatButton, PageHeader, Skeleton, WorkshopForm],
  changeDetection: ChangeDetectionStrategy.OnPush,
  providers: [WorkshopStore],
  template: `
    <app-page-header i18n-heading heading="Workshop settings" />
    <div class="page narrow">
      @if (store.workshop(); as workshop) {
        <section class="stack">
          <h2 i18n>Picture</h2>
          <app-logo-entry />
        </section>
        <app-workshop-form [workshop]="workshop" />
      } @else if (store.problem()) {
        <app-empty-state icon="settings" i18n-heading heading="The settings did not come" [text]="store.problem()">
          <button matButton="outlined" type="button" (click)="store.reload()" i18n>Ask again</button>
        </app-empty-state>
      } @else {
        <app-skeleton [lines]="8" />
      }
    </div>
  `,
})
export class WorkshopPage {
  protected readonly store = inject(WorkshopStore);
}
