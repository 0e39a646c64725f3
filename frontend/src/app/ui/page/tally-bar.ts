import { ChangeDetectionStrategy, Component, ElementRef, inject, input } from '@angular/core';
import { RouterLink, RouterLinkActive } from '@angular/router';
import type { TallyCell } from './tally-cell';

/** The way through a job: its places in a row, each with its own figure under its name, gold under the one that is open. */
@Component({
  selector: 'app-tally-bar',
  imports: [RouterLink, RouterLinkActive],
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { '(window:resize)': 'reveal()' },
  templateUrl: './tally-bar.html',
  styleUrl: './tally-bar.scss',
})
export class TallyBar {
  private readonly host = inject<ElementRef<HTMLElement>>(ElementRef);

  readonly cells = input.required<readonly TallyCell[]>();

  /** On a phone the row is wider than the screen; the open place comes into view. */
  protected show(isOpen: boolean, index: number): void {
    if (isOpen) this.bringIntoView(this.host.nativeElement.querySelectorAll('a')[index]);
  }

  /** A phone that is turned shows the open place again. */
  protected reveal(): void {
    this.bringIntoView(this.host.nativeElement.querySelector('a.open'));
  }

  private bringIntoView(cell: Element | null | undefined): void {
    cell?.scrollIntoView?.({ block: 'nearest', inline: 'center' });
  }
}
