import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import type { ClientIssue } from '#shared/client-page/client-issue-schema';
import { MemberPicture } from '../measure';
import { ClientIssueStore } from './client-issue-store';

type Member = ClientIssue['pieces'][number]['members'][number];

/** So many members are drawn by themselves, the first before the others; what is more is one press away. */
const first = 3;

/** The piece member by member, drawn to scale: those of the base, and of what was chosen in its place. */
@Component({
  selector: 'app-client-pieces',
  imports: [MatButton, MemberPicture],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @for (piece of pieces(); track piece.id) {
      <section>
        @if (pieces().length > 1) {
          <h3>{{ piece.name }}</h3>
        }
        @for (member of piece.members; track member.id) {
          <article>
            <app-member-picture [shape]="member.shape" [name]="member.name" [most_px]="180" />
            <p>
              <strong>{{ member.name }}</strong>
              @if (member.count > 1) {
                <span class="muted">&ngsp;× {{ member.count }}</span>
              }
            </p>
            <p class="muted">{{ about(member) }}</p>
            @for (finish of member.finishes; track finish) {
              <p class="muted">{{ finish }}</p>
            }
          </article>
        }
      </section>
    }
    @if (hidden() > 0) {
      @defer (when store.shown() > 1) {
        <button matButton="outlined" type="button" (click)="isWhole.set(true)" i18n>
          Show {hidden(), plural, =1 {one more member} other {{{ hidden() }} more members}}
        </button>
      }
    }
  `,
  styles: `
    :host {
      display: grid;
      gap: 16px;
      justify-items: start;
    }

    section {
      display: grid;
      gap: 20px 32px;
      grid-template-columns: repeat(auto-fill, minmax(min(100%, 320px), 1fr));
      width: 100%;
    }

    h3 {
      grid-column: 1 / -1;
    }

    article {
      min-width: 0;
    }

    p {
      margin: 0;
    }
  `,
})
export class ClientPieces {
  protected readonly store = inject(ClientIssueStore);

  readonly issue = input.required<ClientIssue>();
  protected readonly isWhole = signal(false);

  private readonly all = computed(() =>
    this.issue().pieces.map((piece) => ({ ...piece, members: piece.members.filter((member) => this.isMade(member)) })),
  );
  protected readonly pieces = computed(() =>
    this.isWhole() ? this.all() : beginningOf(this.all(), this.store.shown() > 1 ? first : 1),
  );
  protected readonly hidden = computed(() => countOf(this.all()) - countOf(this.pieces()));

  protected about({ timber, ornaments }: Member): string {
    return [timber, ...ornaments].filter((text) => text !== '').join(', ');
  }

  private isMade({ id, alternativeId }: Member): boolean {
    const choice = this.store.choice();
    const replaced = this.issue()
      .alternatives.filter((alternative) => choice.includes(alternative.id))
      .flatMap(({ replaces }) => replaces);
    return (alternativeId === null || choice.includes(alternativeId)) && !replaced.includes(id);
  }
}

type Piece = ClientIssue['pieces'][number];

const countOf = (pieces: readonly Piece[]): number => pieces.reduce((sum, { members }) => sum + members.length, 0);

function beginningOf(pieces: readonly Piece[], count: number): Piece[] {
  let left = count;
  return pieces.flatMap((piece) => {
    const members = piece.members.slice(0, Math.max(0, left));
    left -= members.length;
    return members.length > 0 ? [{ ...piece, members }] : [];
  });
}
