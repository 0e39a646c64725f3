import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { EntryAt, type EntryChoice } from '../../ui/field/entry-at';
import { EstimateStore } from '../estimate-store';
import type { MemberForm } from '../members/member-form';

/** What a member is called, how many there are, of which timber and of which piece. */
@Component({
  selector: 'app-member-particulars',
  imports: [EntryAt],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div class="fields particulars">
      <app-entry-at class="name" way="line" i18n-label label="Name" path="name" [form]="form()" />
      <app-entry-at way="number" i18n-label label="How many" path="count" [form]="form()" />
      <app-entry-at way="choice" i18n-label label="Timber" path="timberId" [choices]="timbers()" [form]="form()" />
      @if (pieces().length > 1) {
        <app-entry-at way="choice" i18n-label label="Piece" path="pieceId" [choices]="pieces()" [form]="form()" />
      }
    </div>
  `,
  styles: `
    .particulars {
      grid-template-columns: repeat(auto-fit, minmax(min(100%, 136px), 1fr));
    }

    .name {
      grid-column: span 2;
    }

    @media (min-width: 1000px) {
      .particulars {
        grid-template-columns: minmax(0, 2.4fr) minmax(0, 0.8fr) minmax(0, 1.6fr);
        grid-auto-columns: minmax(0, 1.6fr);
        grid-auto-flow: column;
      }

      .name {
        grid-column: auto;
      }
    }
  `,
})
export class MemberParticulars {
  private readonly store = inject(EstimateStore);

  readonly form = input.required<MemberForm>();

  /** Without a card (office, bench) the timber is known by name alone. */
  protected readonly timbers = computed<readonly EntryChoice[]>(() => {
    const timbers = this.store.card()?.carving.timbers.map(({ id, name }) => ({ value: id, label: name })) ?? [];
    const own = this.form().value<string>('timberId') ?? '';
    const isKnown = timbers.some(({ value }) => value === own);
    return isKnown ? timbers : [{ value: own, label: this.timberName() }, ...timbers];
  });
  protected readonly pieces = computed<readonly EntryChoice[]>(() =>
    this.store.pieces().map(({ id, name }) => ({ value: id, label: name })),
  );

  private timberName(): string {
    const own = this.form().value<string>('timberId') ?? '';
    const worked = this.store.figures()?.members.find((member) => {
      const entered = this.store.members().find(({ id }) => id === member.memberId);
      return entered?.timberId === own;
    });
    return worked?.timber ?? own;
  }
}
