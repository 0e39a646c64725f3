import { ChangeDetectionStrategy, Component, computed, inject, input, output } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { type Params, RouterLink } from '@angular/router';
import type { Alternative } from '#shared/estimates/settings';
import { settingsSchema } from '#shared/estimates/settings-schema';
import { Entry } from '../../ui/field/entry';
import { Field } from '../../ui/field/field';
import { EstimateStore } from '../estimate-store';
import { liveForm } from '../settings/live-form';
import { AlternativeActions } from './alternative-actions';
import { itemsOfAlternative, replaceableItems, type ReplaceableItem } from './alternative-items';

const places: Readonly<Record<ReplaceableItem['kind'], string>> = {
  member: 'measure',
  zone: 'gild',
  ornament: 'carve',
  extra: 'price',
};

const kindNames: Readonly<Record<ReplaceableItem['kind'], string>> = {
  member: $localize`member`,
  zone: $localize`zone`,
  ornament: $localize`ornament`,
  extra: $localize`further line`,
};

/** One alternative: its words, what of the base falls away for it, and what stands in it alone. */
@Component({
  selector: 'app-alternative-form',
  imports: [Entry, Field, MatButton, ReactiveFormsModule, RouterLink],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './alternative-form.html',
  styleUrl: './alternative-form.scss',
})
export class AlternativeForm {
  private readonly actions = inject(AlternativeActions);
  private readonly store = inject(EstimateStore);

  readonly alternative = input.required<Alternative>();
  readonly removed = output();

  protected readonly live = liveForm(
    {
      key: () => `alternative ${this.alternative().id}`,
      schema: settingsSchema.shape.alternatives.element,
      present: () => ({ ...this.alternative(), replaces: [...this.alternative().replaces] }),
      apply: (value) => this.actions.replace(value),
    },
    { id: '', name: '', group: '', note: '', replaces: [] },
  );
  protected readonly kindNames = kindNames;
  protected readonly groups = computed(() => [
    ...new Set((this.store.settings()?.alternatives ?? []).map(({ group }) => group).filter(Boolean)),
  ]);
  protected readonly items = computed(() => {
    const draft = this.store.draft();
    const replaced = new Set(this.alternative().replaces);
    return (draft ? replaceableItems(draft, this.ornamentName()) : []).map((item) => ({
      item,
      isReplaced: replaced.has(item.id),
    }));
  });
  protected readonly own = computed(() => {
    const draft = this.store.draft();
    return draft ? itemsOfAlternative(draft, this.alternative().id, this.ornamentName()) : [];
  });
  private readonly ornamentName = computed(() => {
    const ornaments = new Map((this.store.card()?.carving.ornaments ?? []).map(({ id, name }) => [id, name]));
    return (ornamentId: string) => ornaments.get(ornamentId) ?? ornamentId;
  });

  /** Where it is entered. */
  protected placeOf({ kind }: ReplaceableItem): string {
    return `../${places[kind]}`;
  }

  protected queryOf({ memberId }: ReplaceableItem): Params {
    return memberId === null ? { part: 'extras' } : { member: memberId };
  }

  protected message(entry: string): string {
    const place = (this.store.settings()?.alternatives ?? []).findIndex(({ id }) => id === this.alternative().id);
    return this.live.message(entry, `alternatives.${place}.${entry}`);
  }

  protected turn(item: ReplaceableItem, isReplaced: boolean): void {
    const others = this.alternative().replaces.filter((id) => id !== item.id);
    this.actions.replace({ ...this.alternative(), replaces: isReplaced ? [...others, item.id] : others });
  }

  protected copy(item: ReplaceableItem): void {
    this.actions.copyInto(this.alternative(), item);
  }

  protected remove(): void {
    this.actions.remove(this.alternative());
    this.removed.emit();
  }
}
