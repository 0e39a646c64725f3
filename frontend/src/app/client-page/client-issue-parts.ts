import { ChangeDetectionStrategy, Component, computed, inject, input, output } from '@angular/core';
import { MatButton } from '@angular/material/button';
import type { ClientIssue } from '#shared/client-page/client-issue-schema';
import { Formats } from '../core/formats/formats';
import { Words } from '../core/formats/words';
import { FindingList } from '../ui/page/finding-list';
import { Skeleton } from '../ui/page/skeleton';
import { ClientChoices } from './client-choices';
import { ClientIssueStore, partsOfIssue } from './client-issue-store';
import { ClientLines } from './client-lines';
import { ClientPayments } from './client-payments';
import { ClientThread } from './client-thread';
import { takenAway } from './taken-away';

/** An estimate below its pieces, part after part: the choices, the price, the terms, questions, and the answer. */
@Component({
  selector: 'app-client-issue-parts',
  imports: [ClientChoices, ClientLines, ClientPayments, ClientThread, FindingList, MatButton, Skeleton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './client-issue-parts.html',
  styleUrl: './client-issue-parts.scss',
})
export class ClientIssueParts {
  protected readonly store = inject(ClientIssueStore);
  protected readonly formats = inject(Formats);
  protected readonly words = inject(Words);

  readonly issue = input.required<ClientIssue>();
  readonly declining = output();

  protected readonly parts = partsOfIssue;
  protected readonly shown = this.store.shown;
  protected readonly care = computed(() =>
    (this.store.price()?.care ?? []).map((code) => this.words.say(code as 'care-handling')),
  );
  /** What a variation takes away, in words. */
  protected readonly takenAway = computed(() =>
    takenAway({ words: this.words, formats: this.formats }, this.store.price()),
  );
  protected readonly dates = computed(() => {
    const programme = this.store.programme();
    if (!programme) return '';
    const [starts, finishes, offered] = [programme.startsOn, programme.finishesOn, programme.offeredOn].map((day) =>
      this.formats.day(day),
    );
    return this.words.say('paper-programme-dates', { starts, finishes, offered, days: programme.workingDays });
  });
}
