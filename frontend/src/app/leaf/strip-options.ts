import { ChangeDetectionStrategy, Component, computed, inject, input, output } from '@angular/core';
import type { LaysOption } from '#shared/leaf/lays-laying';
import { Formats } from '../core/formats/formats';

let count = 0;

/** Every way to cut a leaf in strips with what it takes of leaf and of laying; one is chosen, or the cheapest followed. */
@Component({
  selector: 'app-strip-options',
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './strip-options.html',
  styleUrl: './strip-options.scss',
})
export class StripOptions {
  private readonly formats = inject(Formats);

  readonly options = input.required<readonly LaysOption[]>();
  /** What somebody chose; null follows the cheapest. */
  readonly chosen = input<number | null>(null);
  /** What is taken as things stand. */
  readonly taken = input<number | null>(null);
  readonly perZone = input(1);
  readonly picked = output<number | null>();

  protected readonly group = `strips-${++count}`;
  protected readonly summary = computed(() => {
    const taken = this.formats.number(this.taken() ?? 0, 0);
    const ways = this.formats.number(this.options().length, 0);
    return this.chosen() === null
      ? $localize`${taken}:strips:, the cheapest of ${ways}:ways: ways`
      : $localize`${taken}:strips:, one of ${ways}:ways: ways`;
  });
  protected readonly lines = computed(() =>
    this.options().map(({ strips, strip_mm, laysAcross, piecesAlong, leaves, cost }) => ({
      strips,
      isTaken: strips === this.taken(),
      width: this.formats.length(strip_mm),
      pieces: `${this.formats.number(laysAcross, 0)} × ${this.formats.number(piecesAlong, 0)}`,
      leaves: this.formats.number(leaves * this.perZone(), 1, 1),
      cost: this.formats.money(Math.round(cost * this.perZone() * 10 ** this.formats.currencyDigits())),
    })),
  );
}
