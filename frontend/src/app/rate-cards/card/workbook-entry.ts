import { ChangeDetectionStrategy, Component, inject, output, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { ProblemError } from '../../core/problems/problem-error';
import { Notices } from '../../core/problems/notices';
import { RateCardCalls } from '../rate-card-calls';
import { CardSaving } from './card-saving';
import { CardStore } from './card-store';

/** A cell of a workbook that could not be taken, in words. */
interface BadCell {
  readonly place: string;
  readonly message: string;
}

function placeOf([sheet, row, column]: readonly (string | number)[]): string {
  if (sheet === undefined) return '';
  if (row === undefined) return $localize`Sheet “${sheet}:sheet:”`;
  if (column === undefined) return $localize`Sheet “${sheet}:sheet:”, row ${row}:row:`;
  return $localize`Sheet “${sheet}:sheet:”, cell ${column}:column:${row}:row:`;
}

/** Fills a draft from a workbook: all of it, or nothing and a list of the cells that are not right. */
@Component({
  selector: 'app-workbook-entry',
  imports: [MatButton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './workbook-entry.html',
  styleUrl: './workbook-entry.scss',
})
export class WorkbookEntry {
  private readonly calls = inject(RateCardCalls);
  private readonly store = inject(CardStore);
  private readonly saving = inject(CardSaving);
  private readonly notices = inject(Notices);

  readonly closed = output();

  protected readonly isSending = signal(false);
  protected readonly refusal = signal('');
  protected readonly badCells = signal<readonly BadCell[]>([]);

  protected async take(file: File | undefined): Promise<void> {
    const card = this.store.summary();
    if (!file || !card || !(await this.saving.flush())) return;
    this.isSending.set(true);
    this.refusal.set('');
    this.badCells.set([]);
    try {
      const seen = this.store.summary() ?? card;
      await this.calls.fill(seen, file);
      this.store.put(await this.calls.read(card.id));
      this.notices.say($localize`The draft was filled from ${file.name}:file:.`);
      this.closed.emit();
    } catch (error) {
      this.refuse(error);
    } finally {
      this.isSending.set(false);
    }
  }

  private refuse(error: unknown): void {
    if (!(error instanceof ProblemError)) throw error;
    this.refusal.set(error.problem.title);
    this.badCells.set(error.problem.errors.map(({ path, message }) => ({ place: placeOf(path), message })));
  }
}
