import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { MemberSelection } from './members/member-selection';
import { MemberPlace } from './places/member-place';

/** Measure: the members of the estimate and the surface of each. */
@Component({
  selector: 'app-measure-page',
  imports: [MemberPlace],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-member-place>
      @if (selection.member(); as member) {
        <h2>{{ member.name }}</h2>
      }
    </app-member-place>
  `,
})
export class MeasurePage {
  protected readonly selection = inject(MemberSelection);
}
