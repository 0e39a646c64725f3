import { CdkDrag, type CdkDragDrop, CdkDragPreview, CdkDropList, CdkDropListGroup } from '@angular/cdk/drag-drop';
import {
  ChangeDetectionStrategy,
  Component,
  ElementRef,
  Injector,
  afterNextRender,
  computed,
  inject,
} from '@angular/core';
import { MatButton, MatIconButton } from '@angular/material/button';
import { MatMenu, MatMenuContent, MatMenuItem, MatMenuTrigger } from '@angular/material/menu';
import type { Member, Piece } from '#shared/estimates/member';
import { ShapeGlyph } from '../../measure';
import { Icon } from '../../ui/icon/icon';
import { Grip } from '../../ui/order/grip';
import { EstimateStore } from '../estimate-store';
import { MemberActions } from './member-actions';
import { MemberRows } from './member-row';
import { MemberSelection } from './member-selection';

const arrows: Readonly<Partial<Record<string, -1 | 1>>> = { ArrowUp: -1, ArrowDown: 1 };

/** The members of the estimate, piece by piece: one chooses, adds, moves, doubles and removes them here. */
@Component({
  selector: 'app-member-list',
  imports: [
    CdkDrag,
    CdkDragPreview,
    CdkDropList,
    CdkDropListGroup,
    Grip,
    Icon,
    MatButton,
    MatIconButton,
    MatMenu,
    MatMenuContent,
    MatMenuItem,
    MatMenuTrigger,
    ShapeGlyph,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './member-list.html',
  styleUrl: './member-list.scss',
})
export class MemberList {
  private readonly rows = inject(MemberRows);
  private readonly injector = inject(Injector);
  private readonly host = inject<ElementRef<HTMLElement>>(ElementRef);
  protected readonly store = inject(EstimateStore);
  protected readonly selection = inject(MemberSelection);
  protected readonly actions = inject(MemberActions);

  protected readonly groups = computed(() =>
    this.store.pieces().map((piece) => ({
      piece,
      rows: this.store
        .members()
        .filter((member) => member.pieceId === piece.id)
        .map((member) => this.rows.of(member, this.store)),
    })),
  );

  protected drop(event: CdkDragDrop<Piece, Piece, Member>): void {
    this.actions.move(event.item.data, event.container.data.id, event.currentIndex);
  }

  protected dropPiece({ item, currentIndex }: CdkDragDrop<unknown, unknown, Piece>): void {
    this.actions.movePiece(item.data, currentIndex);
  }

  /** Alt and an arrow move a piece with its members; one stays at its button. */
  protected pressPiece(event: KeyboardEvent, piece: Piece): void {
    const by = arrows[event.key];
    if (!by || !event.altKey) return;
    event.preventDefault();
    this.shiftPiece(piece, by);
  }

  protected shiftPiece(piece: Piece, by: -1 | 1): void {
    this.actions.shiftPiece(piece, by);
    this.focus(() => `[data-piece="${piece.id}"]`);
  }

  /** Alt and an arrow move a member, arrows alone go to the next one. */
  protected press(event: KeyboardEvent, member: Member): void {
    const by = arrows[event.key];
    if (by) {
      if (event.altKey) this.shift(member, by);
      else this.focusBeside(event, by);
      event.preventDefault();
    } else if (event.key === 'Delete' && this.store.mayEdit()) {
      this.actions.remove(member);
      this.focus(() => `[data-member="${this.selection.member()?.id ?? ''}"]`);
    }
  }

  protected async add(): Promise<void> {
    const { askForShape } = await import('./shape-dialog');
    const chosen = await askForShape(this.injector);
    if (chosen) this.actions.add(chosen.shape, chosen.name);
  }

  protected async paste(): Promise<void> {
    const { askForPastedMembers } = await import('./paste-dialog');
    const contents = await askForPastedMembers(this.injector, this.actions.end());
    if (contents) this.actions.insert(contents);
  }

  protected async rename(piece: Piece): Promise<void> {
    const { askForName } = await import('./name-dialog');
    const name = await askForName(this.injector, $localize`Name of the piece`, piece.name);
    if (name) this.store.changePiece(piece.id, { name, place: piece.place, note: piece.note });
  }

  protected async addPiece(): Promise<void> {
    const { askForName } = await import('./name-dialog');
    const name = await askForName(this.injector, $localize`Name of the new piece`, '');
    if (name) this.actions.addPiece(name);
  }

  private shift(member: Member, by: -1 | 1): void {
    if (!this.store.mayEdit()) return;
    this.actions.shift(member, by);
    this.focus(() => `[data-member="${member.id}"]`);
  }

  private focus(selector: () => string): void {
    const focus = () => this.host.nativeElement.querySelector<HTMLElement>(selector())?.focus();
    afterNextRender(focus, { injector: this.injector });
  }

  private focusBeside(event: KeyboardEvent, by: -1 | 1): void {
    const all = [...this.host.nativeElement.querySelectorAll<HTMLElement>('[data-member]')];
    all.at(all.indexOf(event.currentTarget as HTMLElement) + by)?.focus();
  }
}
