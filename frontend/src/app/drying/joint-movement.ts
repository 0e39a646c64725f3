import { ChangeDetectionStrategy, Component, type OnInit, computed, inject, input } from '@angular/core';
import type { Timber } from '#shared/carving/timber';
import type { Climate } from '#shared/drying/climate';
import type { DryingCard } from '#shared/drying/drying-card';
import { woodMovement } from '#shared/drying/wood-movement';
import { Formats } from '../core/formats/formats';
import { documentForm } from '../core/forms/document-form';
import { offeredIn } from '../measure';
import { EntryAt, type EntryChoice } from '../ui/field/entry-at';
import type { Explained } from '../ui/figure/explained';
import { Figure } from '../ui/figure/figure';
import { FindingList } from '../ui/page/finding-list';
import { type Joint, jointSchema } from '#shared/drying/joint-schema';

const cuts: readonly EntryChoice[] = [
  { value: 'tangential', label: $localize`along the rings (flat sawn)` },
  { value: 'radial', label: $localize`across the rings (quarter sawn)` },
];

/** How far a joint moves between the air of the shop and that of the place; nothing of it is kept. */
@Component({
  selector: 'app-joint-movement',
  imports: [EntryAt, Figure, FindingList],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <form class="fields" (submit)="$event.preventDefault()">
      <app-entry-at way="length" i18n-label label="Width across the grain" path="width_mm" [form]="form" />
      <app-entry-at way="choice" i18n-label label="Timber" path="timberId" [choices]="choices()" [form]="form" />
      <app-entry-at way="choice" i18n-label label="Cut" path="cut" [choices]="cuts" [form]="form" />
      <app-entry-at
        class="whole"
        way="tick"
        i18n-label
        label="Gesso goes over the joint"
        path="isGessoed"
        [form]="form"
      />
    </form>
    @if (explained(); as moved) {
      <p>
        <app-figure [text]="moved.heading" [explained]="moved" />&ngsp;
        <span class="muted" i18n>between shop and site</span>
      </p>
    }
    @if (movement(); as moved) {
      <app-finding-list [findings]="moved.findings" />
    }
  `,
  styles: `
    :host {
      display: grid;
      gap: 12px;
    }
  `,
})
export class JointMovement implements OnInit {
  private readonly formats = inject(Formats);

  readonly timbers = input.required<readonly Timber[]>();
  readonly card = input.required<DryingCard>();
  readonly shop = input.required<Climate>();
  readonly site = input.required<Climate>();

  protected readonly cuts = cuts;
  protected readonly form = documentForm(jointSchema);
  protected readonly choices = computed<readonly EntryChoice[]>(() =>
    this.timbers().map(({ id, name }) => ({ value: id, label: name })),
  );
  protected readonly movement = computed(() => {
    const joint = this.form.parsed();
    const timber = this.timbers().find(({ id }) => id === joint?.timberId);
    if (!joint || !timber) return undefined;
    const { radialCoefficient, tangentialCoefficient } = timber;
    const coefficient = joint.cut === 'radial' ? radialCoefficient : tangentialCoefficient;
    const { width_mm, isGessoed: isGessoedJoint } = joint;
    const moved = woodMovement(
      { width_mm, coefficient, from: this.shop(), to: this.site(), isGessoedJoint },
      this.card(),
    );
    // That the two airs are apart is told above, once.
    return { ...moved, findings: moved.findings.filter(({ code }) => code === 'drying-joint-moves') };
  });
  protected readonly explained = computed<Explained | undefined>(() => {
    const moved = this.movement();
    if (!moved) return undefined;
    const size = this.formats.length(Math.abs(moved.movement_mm));
    const heading = moved.movement_mm < 0 ? $localize`${size}:size: narrower` : $localize`${size}:size: wider`;
    return { id: 'joint', heading, reasons: moved.reasons };
  });

  ngOnInit(): void {
    const timberId = this.timbers().at(0)?.id ?? '';
    const joint: Joint = { width_mm: 100, timberId, cut: 'tangential', isGessoed: true };
    this.form.reset(offeredIn(this.formats.lengthUnit(), joint));
  }
}
