import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import type { Part } from './part';

/** The parts of a place, each with its own figure; the one that is open is tinted. */
@Component({
  selector: 'app-part-list',
  imports: [RouterLink],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <h2>{{ heading() }}</h2>
    <ul class="plain">
      @for (part of parts(); track part.key) {
        <li [class.chosen]="part.key === open()">
          <a [routerLink]="part.route" [attr.aria-current]="part.key === open() ? 'true' : null">
            <span class="names">
              <span class="name">{{ part.name }}</span>
              <span class="about">{{ part.about }}</span>
            </span>
            <span class="amount">{{ part.amount }}</span>
          </a>
        </li>
      }
    </ul>
    <ng-content />
  `,
  styleUrl: './part-list.scss',
})
export class PartList {
  readonly heading = input.required<string>();
  readonly parts = input.required<readonly Part[]>();
  /** The key of the part that is shown. */
  readonly open = input<string>();
}
