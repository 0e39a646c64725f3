import { CdkDrag, type CdkDragDrop, CdkDropList } from '@angular/cdk/drag-drop';
import {
  ChangeDetectionStrategy,
  Component,
  ElementRef,
  Injector,
  afterNextRender,
  computed,
  inject,
  input,
} from '@angular/core';
import { MatButton } from '@angular/material/button';
import type { Zone } from '#shared/estimates/member';
import type { ProfileElement } from '#shared/measure/profile-element';
import { reliefs } from '#shared/measure/relief';
import { Formats } from '../../core/formats/formats';
import { PartPicker, reliefNames } from '../../measure';
import { EntryAt } from '../../ui/field/entry-at';
import type { Explained } from '../../ui/figure/explained';
import { Figure } from '../../ui/figure/figure';
import { Icon } from '../../ui/icon/icon';
import { Grip } from '../../ui/order/grip';
import { StepButtons } from '../../ui/order/step-buttons';
import { EstimateStore } from '../estimate-store';
import type { MemberForm } from '../members/member-form';
import { MemberSelection } from '../members/member-selection';
import { addZone } from './add-zone';

/** The zones of a member: what of its surface each takes, and how deep its relief is. They change places by their grip or by Alt and the arrows. What is laid on it is chosen in Gild. */
@Component({
  selector: 'app-zone-list',
  imports: [CdkDrag, CdkDropList, EntryAt, Figure, Grip, Icon, MatButton, PartPicker, StepButtons],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './zone-list.html',
  styleUrl: './item-list.scss',
  host: { '(keydown)': 'press($event)' },
})
export class ZoneList {
  private readonly store = inject(EstimateStore);
  private readonly selection = inject(MemberSelection);
  private readonly formats = inject(Formats);
  private readonly injector = inject(Injector);
  private readonly host = inject<ElementRef<HTMLElement>>(ElementRef);

  readonly form = input.required<MemberForm>();
  readonly isDisabled = input(false);

  protected readonly reliefs = reliefs.map((value) => ({ value, label: reliefNames[value] }));
  private readonly figures = computed(() =>
    this.store.figures()?.members.find(({ memberId }) => memberId === this.selection.member()?.id),
  );
  /** The girth’s parts, of which a zone may take some by themselves. */
  protected readonly parts = computed(() => this.figures()?.parts ?? []);
  /** The profile as it was last possible. */
  protected readonly profile = computed<readonly ProfileElement[]>(() => {
    const shape = this.selection.member()?.shape;
    return shape && 'profile' in shape ? shape.profile : [];
  });
  protected readonly zones = computed(() => {
    const zones = this.form().value<readonly Zone[]>('zones') ?? [];
    return this.form()
      .items('zones')
      .map((control, index) => ({
        control,
        path: `zones.${index}`,
        zone: zones[index],
        alternative: this.alternativeOf(zones[index]),
        worked: this.worked(zones[index]),
      }));
  });

  protected takenBeside(index: number): readonly string[] {
    return this.zones().flatMap(({ zone }, other) =>
      other !== index && zone.take.way === 'parts' ? zone.take.parts : [],
    );
  }

  protected add(): void {
    addZone(this.form(), this.store.card());
  }

  protected remove(index: number): void {
    this.form().remove('zones', index);
  }

  protected drop({ previousIndex, currentIndex }: CdkDragDrop<unknown>): void {
    this.form().move('zones', previousIndex, currentIndex);
  }

  protected press(event: KeyboardEvent): void {
    const by = { ArrowUp: -1, ArrowDown: 1 }[event.key];
    const index = this.items().indexOf((event.target as HTMLElement).closest('.item') as HTMLElement);
    if (!by || !event.altKey || index < 0 || this.isDisabled()) return;
    event.preventDefault();
    this.shift(index, by);
  }

  /** The entry one stands at goes along with its zone. */
  protected shift(index: number, by: number): void {
    const to = index + by;
    if (to < 0 || to >= this.zones().length) return;
    const place = this.entriesOf(index).indexOf(document.activeElement as HTMLElement);
    this.form().move('zones', index, to);
    const focus = () => (this.entriesOf(to).at(Math.max(0, place)) ?? this.entriesOf(to).at(0))?.focus();
    afterNextRender(focus, { injector: this.injector });
  }

  private entriesOf(index: number): HTMLElement[] {
    return [...this.items()[index].querySelectorAll<HTMLElement>('input, select, button')];
  }

  private items(): HTMLElement[] {
    return [...this.host.nativeElement.querySelectorAll<HTMLElement>('.item')];
  }

  protected takeBy(path: string, way: 'share' | 'parts'): void {
    const take = way === 'share' ? { way, share_percent: 100 } : { way, parts: [] };
    this.form().put(`${path}.take`, take);
  }

  protected takeParts(path: string, parts: readonly string[]): void {
    this.form().put(`${path}.take`, { way: 'parts', parts });
  }

  /** The alternative it belongs to; its share is not added to that of the others. */
  private alternativeOf(zone: Zone | undefined): string {
    const id = zone?.alternativeId ?? null;
    const name = this.store.settings()?.alternatives.find((one) => one.id === id)?.name;
    return name ? $localize`in “${name}:alternative:”` : '';
  }

  private worked(zone: Zone | undefined): { text: string; explained: Explained } | undefined {
    const figures = this.store.figures()?.zones.find(({ zoneId }) => zoneId === zone?.id);
    if (!figures) return undefined;
    const text = this.formats.area(figures.true_mm2);
    return { text, explained: { id: `zone ${figures.zoneId}`, heading: text, reasons: figures.reasons } };
  }
}
