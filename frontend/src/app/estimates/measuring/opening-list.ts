import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { MatButton } from '@angular/material/button';
import type { ShapeKind } from '#shared/measure/shape';
import { Formats } from '../../core/formats/formats';
import { newId } from '../../core/new-id';
import { offeredIn, ShapeForm } from '../../measure';
import { EntryAt } from '../../ui/field/entry-at';
import { Icon } from '../../ui/icon/icon';
import type { MemberForm } from '../members/member-form';

const faces: readonly ShapeKind[] = ['rectangle', 'triangle', 'circle', 'ellipse', 'ring', 'polygon', 'measured'];

/** What is cut out of each of the members that are alike. */
@Component({
  selector: 'app-opening-list',
  imports: [EntryAt, Icon, MatButton, ShapeForm],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './opening-list.html',
  styleUrl: './item-list.scss',
})
export class OpeningList {
  private readonly formats = inject(Formats);

  readonly form = input.required<MemberForm>();
  readonly isDisabled = input(false);

  protected readonly faces = faces;
  protected readonly openings = computed(() => this.form().items('openings'));

  protected add(): void {
    const shape = offeredIn(this.formats.lengthUnit(), { kind: 'circle', diameter_mm: 60 });
    this.form().insert('openings', this.openings().length, { id: newId(), shape, count: 1 });
  }

  protected remove(index: number): void {
    this.form().remove('openings', index);
  }
}
