import { ChangeDetectionStrategy, Component, computed, inject, input, output } from '@angular/core';
import type { ClientIssue } from '#shared/client-page/client-issue-schema';
import { Skeleton } from '../ui/page/skeleton';
import { ClientIssueStore, partsOfIssue } from './client-issue-store';
import { ClientPieces } from './client-pieces';
import { inTurn } from './in-turn';
import { ClientIssueParts } from './later-parts';

/** All of an estimate below its head: the pieces at once, what stands further down when its reader goes there. */
@Component({
  selector: 'app-client-issue-rest',
  imports: [ClientIssueParts, ClientPieces, Skeleton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (issue().pieces.length > 0) {
      <section>
        <h2 i18n>The piece</h2>
        <app-client-pieces [issue]="issue()" />
      </section>
    }
    @defer (when store.shown() > 2) {
      <app-client-issue-parts class="rest" [class.whole]="isWhole()" [issue]="issue()" (declining)="declining.emit()" />
    } @placeholder {
      <app-skeleton class="rest" [lines]="8" />
    } @error {
      <p class="rest" role="alert" i18n>The rest of it could not be fetched. Please open this page again.</p>
    }
  `,
  styles: `
    :host {
      display: grid;
      gap: 40px;
      align-content: start;
    }

    section {
      display: grid;
      gap: 12px;
      min-width: 0;
    }

    // Higher than a screen, so that nothing in view is moved by what comes.
    .rest:not(.whole) {
      align-content: start;
      min-height: 200vh;
    }
  `,
})
export class ClientIssueRest {
  protected readonly store = inject(ClientIssueStore);

  protected readonly isWhole = computed(() => this.store.shown() >= partsOfIssue);

  readonly issue = input.required<ClientIssue>();
  readonly declining = output();

  constructor() {
    inTurn(partsOfIssue, this.store.shown);
  }
}
