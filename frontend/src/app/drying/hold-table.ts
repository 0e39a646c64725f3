import { ChangeDetectionStrategy, Component, inject, input } from '@angular/core';
import { dayOf } from '#shared/drying/day-length-minutes';
import { Formats } from '../core/formats/formats';
import { smallScreen } from '../ui/screen/small-screen';
import type { FigureColumn } from '../ui/table/figure-column';
import { FigureTable } from '../ui/table/figure-table';
import { holdNames } from './hold-names';
import type { WorkedHold } from './worked-hold';

const unbroken = (text: string): string => text.replaceAll(' ', '\u00a0');

/** Whose approval is waited for, how long that usually takes, and which steps wait: what the ribbon shows, in words. */
@Component({
  selector: 'app-hold-table',
  imports: [FigureTable],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-figure-table
      captionShown
      i18n-caption
      caption="Waits for people"
      [columns]="isSmall() ? [approval, elapsed] : [approval, usual, elapsed, waits]"
      [rows]="holds()"
      [rowId]="idOf"
    />
  `,
})
export class HoldTable {
  private readonly formats = inject(Formats);
  protected readonly isSmall = smallScreen();

  readonly holds = input.required<readonly WorkedHold[]>();

  protected readonly idOf = ({ hold, from_minutes }: WorkedHold): string => `${hold} ${from_minutes}`;
  protected readonly approval: FigureColumn<WorkedHold> = {
    key: 'approval',
    heading: $localize`Approval`,
    kind: 'text',
    text: ({ hold }) => holdNames[hold],
    minor: (held) => (this.isSmall() ? `${this.usualText(held)}; ${this.waitsText(held)}` : ''),
  };
  protected readonly usual: FigureColumn<WorkedHold> = {
    key: 'usual',
    heading: $localize`Usually`,
    kind: 'text',
    text: (held) => this.usualText(held),
  };
  protected readonly elapsed: FigureColumn<WorkedHold> = {
    key: 'elapsed',
    heading: $localize`Elapsed`,
    kind: 'text',
    text: ({ from_minutes, to_minutes }) => {
      const [first, last] = [this.day(from_minutes), this.day(Math.max(from_minutes, to_minutes - 1))];
      return unbroken(first === last ? $localize`day ${first}:day:` : $localize`day ${first}:day: to ${last}:lastDay:`);
    },
  };
  protected readonly waits: FigureColumn<WorkedHold> = {
    key: 'waits',
    heading: $localize`What waits, and when it begins`,
    kind: 'text',
    text: (held) => this.waitsText(held),
  };

  private usualText({ usual_days }: WorkedHold): string {
    const days = this.formats.number(usual_days, 0);
    return unbroken(usual_days === 1 ? $localize`1 working day` : $localize`${days}:days: working days`);
  }

  private waitsText({ waiting }: WorkedHold): string {
    return waiting
      .map(({ lot, step, start_minutes }) => {
        if (start_minutes === null) return $localize`${step}:step: of ${lot}:lot:`;
        return $localize`${step}:step: of ${lot}:lot:, day ${this.day(start_minutes)}:day:`;
      })
      .join('; ');
  }

  private day(at_minutes: number): string {
    return this.formats.number(dayOf(at_minutes) + 1, 0);
  }
}
