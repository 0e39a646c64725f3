import { ChangeDetectionStrategy, Component, booleanAttribute, computed, inject, input, output } from '@angular/core';
import type { Finding, FindingKind } from '#shared/words/finding';
import { Words } from '../../core/formats/words';

const kindNames: Readonly<Record<Exclude<FindingKind, 'refuse'>, string>> = {
  missing: $localize`Missing from the rate card`,
  warn: $localize`Worth a look`,
  caution: $localize`Caution`,
  note: $localize`Note`,
};

const order: readonly FindingKind[] = ['refuse', 'missing', 'warn', 'caution', 'note'];

/** What a calculation has to tell: refusals first, each with a bar in the colour of its weight. */
@Component({
  selector: 'app-finding-list',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <ul class="plain">
      @for (line of lines(); track $index) {
        <li [class]="line.finding.kind">
          <span class="visually-hidden">{{ line.kind }}:</span>&ngsp;
          @if (linked() && line.finding.about) {
            <button type="button" (click)="chosen.emit(line.finding)">{{ line.text }}</button>
          } @else {
            {{ line.text }}
          }
          @if (line.minor) {
            <span class="minor">{{ line.minor }}</span>
          }
        </li>
      }
    </ul>
  `,
  styleUrl: './finding-list.scss',
})
export class FindingList {
  private readonly words = inject(Words);

  readonly findings = input.required<readonly Finding[]>();
  /** A finding that speaks of a member, zone or ornament can be chosen, to go there. */
  readonly linked = input(false, { transform: booleanAttribute });
  /** What a refusal is called here. */
  readonly stops = input($localize`Stops an issue`);
  /** Where it holds, in a smaller line beneath. */
  readonly minor = input<(finding: Finding) => string>();
  readonly chosen = output<Finding>();

  protected readonly lines = computed(() =>
    [...this.findings()]
      .sort((one, other) => order.indexOf(one.kind) - order.indexOf(other.kind))
      .map((finding) => ({
        finding,
        kind: finding.kind === 'refuse' ? this.stops() : kindNames[finding.kind],
        text: this.words.say(finding.code, finding.values),
        minor: this.minor()?.(finding),
      })),
  );
}
