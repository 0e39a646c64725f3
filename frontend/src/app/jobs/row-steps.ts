import { Directive, ElementRef, inject } from '@angular/core';

/** In a list of links the arrows go from one to the next. */
@Directive({
  selector: '[appRowSteps]',
  exportAs: 'rowSteps',
  host: { '(keydown.arrowdown)': 'step($event, 1)', '(keydown.arrowup)': 'step($event, -1)' },
})
export class RowSteps {
  private readonly host = inject<ElementRef<HTMLElement>>(ElementRef);

  /** Goes to the first link, where there is one. */
  first(): void {
    this.links()[0]?.focus();
  }

  protected step(event: Event, by: 1 | -1): void {
    const links = this.links();
    const at = links.indexOf(event.target as HTMLElement);
    const next = at + by < 0 ? undefined : links.at(at + by);
    if (at < 0 || !next) return;
    event.preventDefault();
    next.focus();
  }

  private links(): HTMLElement[] {
    return [...this.host.nativeElement.querySelectorAll<HTMLElement>('a[data-row]')];
  }
}
