import {
  ChangeDetectionStrategy,
  Component,
  DOCUMENT,
  computed,
  effect,
  inject,
  input,
  type OnInit,
} from '@angular/core';
import { MatButton } from '@angular/material/button';
import { RouterLink, RouterOutlet } from '@angular/router';
import { issueLetter } from '#shared/estimates/issue-letter';
import { PageTitle } from '../../core/routing/page-title';
import { EmptyState } from '../../ui/page/empty-state';
import { PageHeader } from '../../ui/page/page-header';
import { SavingIndicator } from '../../ui/page/saving-indicator';
import { Skeleton } from '../../ui/page/skeleton';
import { TallyBar } from '../../ui/page/tally-bar';
import { UndoButtons } from '../../ui/page/undo-buttons';
import { UnfinishedEntries } from '../draft/unfinished-entries';
import { EstimateStore } from '../estimate-store';
import type { OpenEstimate } from '../open-estimate';
import { MemberSelection } from '../members/member-selection';
import { EstimateTally } from './estimate-tally';
import { WorkspaceNews } from './workspace-news';
import { workspaceProviders } from './workspace-providers';

const longestWait_ms = 2000;

/** What stands round every place of an estimate: its name, how it is kept, the tally as the way through, and the place itself. */
@Component({
  selector: 'app-workspace',
  imports: [
    EmptyState,
    MatButton,
    PageHeader,
    RouterLink,
    RouterOutlet,
    SavingIndicator,
    Skeleton,
    TallyBar,
    UndoButtons,
    WorkspaceNews,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  providers: [...workspaceProviders, EstimateTally],
  host: { '(document:keydown)': 'press($event)' },
  templateUrl: './workspace.html',
  styleUrl: './workspace.scss',
})
export class Workspace implements OnInit {
  private readonly selection = inject(MemberSelection);
  private readonly unfinished = inject(UnfinishedEntries);
  private readonly title = inject(PageTitle, { optional: true });
  private readonly document = inject(DOCUMENT);
  protected readonly store = inject(EstimateStore);
  protected readonly tally = inject(EstimateTally);

  readonly open = input.required<OpenEstimate>();

  protected readonly heading = computed(() => this.store.job()?.title ?? this.store.settings()?.title ?? '');
  /** The estimate’s own title, where it says more than the job’s. */
  protected readonly about = computed(() => {
    const title = this.store.settings()?.title ?? '';
    return title === this.heading() ? '' : title;
  });
  /** The letter the next issue will bear. */
  protected readonly nextLetter = computed(() => issueLetter(this.store.issues().length + 1));

  /** What is agreed is not worked toward any more. */
  protected readonly acceptedLetter = computed(
    () => this.store.issues().find(({ state }) => state === 'accepted')?.letter,
  );

  constructor() {
    effect(() => this.title?.name(this.heading() || undefined));
  }

  /** Sends what is unsent, and waits for it a moment; an absent server is not waited for. */
  async keep(): Promise<void> {
    await Promise.race([this.store.flush(), new Promise((resolve) => setTimeout(resolve, longestWait_ms))]);
  }

  ngOnInit(): void {
    void this.store.open(this.open());
  }

  /** Half a length or an impossible shape is the first thing one takes back. */
  protected undo(): void {
    const shown = this.selection.isOnPlace() ? this.selection.member() : undefined;
    if (!shown || !this.unfinished.forget(shown.id)) this.show(this.store.undo());
  }

  protected redo(): void {
    this.show(this.store.redo());
  }

  protected press(event: KeyboardEvent): void {
    const isUndoKey = (event.ctrlKey || event.metaKey) && !event.altKey && event.key.toLowerCase() === 'z';
    if (!isUndoKey || !this.store.mayEdit() || this.document.querySelector('mat-dialog-container')) return;
    event.preventDefault();
    if (event.shiftKey) this.redo();
    else this.undo();
  }

  /** What was undone comes into view. */
  private show(ids: readonly string[]): void {
    const touched = this.store.members().find(({ id }) => ids.includes(id));
    if (touched && this.selection.isOnPlace()) this.selection.select(touched.id);
  }
}
