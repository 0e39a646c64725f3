import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { MatButton } from '@angular/material/button';
import type { DayHours } from '#shared/programme/shop-calendar';
import type { ShopContent } from '#shared/programme/shop-schema';
import { Formats } from '../../core/formats/formats';
import { newId } from '../../core/new-id';
import { Entry } from '../../ui/field/entry';
import { Field } from '../../ui/field/field';
import { listWith, listWithout } from './list-with';
import { ShopStore } from './shop-store';
import { WeekEntry } from './week-entry';

type Person = ShopContent['people'][number];
type Week = NonNullable<Person['hours']>;

/** Everybody who works: what they can do, when, and when they are away. */
@Component({
  selector: 'app-shop-people',
  imports: [Entry, Field, MatButton, WeekEntry],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './shop-people.html',
  styleUrls: ['./lines.scss', './shop-people.scss'],
})
export class ShopPeople {
  private readonly formats = inject(Formats);
  protected readonly store = inject(ShopStore);

  protected readonly people = computed(() => this.store.content()?.people ?? []);
  protected readonly grades = computed(() => this.store.answer()?.grades ?? []);
  protected readonly memberships = computed(() => this.store.answer()?.memberships ?? []);
  protected readonly weekOf = (week: readonly DayHours[]): Week => week.map((hours) => [...hours]);

  protected change(at: number, change: Partial<Person>): void {
    this.store.change({ people: listWith(this.people(), at, change) });
  }

  protected remove(at: number): void {
    this.store.change({ people: listWithout(this.people(), at) });
  }

  protected add(): void {
    const nobody: Person = {
      ...{ id: newId(), name: '', gradeIds: [], hours: null, absences: [], membershipId: null },
    };
    this.store.change({ people: [...this.people(), nobody] });
  }

  protected can_(at: number, gradeId: string, isSo: boolean): void {
    const others = this.people()[at].gradeIds.filter((id) => id !== gradeId);
    this.change(at, { gradeIds: isSo ? [...others, gradeId] : others });
  }

  /** Own hours begin as the workshop's. */
  protected ownHours(at: number, isSo: boolean): void {
    this.change(at, { hours: isSo ? (this.store.content()?.hours ?? null) : null });
  }

  protected absent(at: number, place: number, change: Partial<Person['absences'][number]>): void {
    this.change(at, { absences: listWith(this.people()[at].absences, place, change) });
  }

  protected present(at: number, place: number): void {
    this.change(at, { absences: listWithout(this.people()[at].absences, place) });
  }

  protected addAbsence(at: number): void {
    const absences = [...this.people()[at].absences, { id: newId(), firstDay: '', lastDay: '', note: '' }];
    this.change(at, { absences });
  }

  protected hoursLine({ hours }: Person): string {
    return hours === null ? $localize`The workshop’s hours` : $localize`Own hours`;
  }

  protected absenceLine({ absences }: Person): string {
    if (absences.length === 0) return $localize`No absences`;
    const days = absences
      .filter(({ firstDay }) => firstDay !== '')
      .map(({ firstDay }) => this.formats.day(firstDay, 'short'));
    return $localize`Away from ${days.join(', ')}:days:`;
  }
}
