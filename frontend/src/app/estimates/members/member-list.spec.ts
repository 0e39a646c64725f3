import { CdkDropList } from '@angular/cdk/drag-drop';
import { type ComponentFixture, TestBed } from '@angular/core/testing';
import { MatDialog } from '@angular/material/dialog';
import { By } from '@angular/platform-browser';
import { ActivatedRoute, convertToParamMap, provideRouter } from '@angular/router';
import { of } from 'rxjs';
import { shapeDefaults } from '#shared/measure/shape-defaults';
import type { Role } from '#shared/actor/role';
import { EstimateServer, ids, workspaceOn } from '../../../test/estimate-server';
import { signIn, words } from '../../../test/sign-in';
import { Notices } from '../../core/problems/notices';
import { EstimateStore } from '../estimate-store';
import { MemberList } from './member-list';
import { newMember } from './new-member';

describe('MemberList', () => {
  let server: EstimateServer;
  let store: EstimateStore;
  let fixture: ComponentFixture<MemberList>;

  const element = () => fixture.nativeElement as HTMLElement;
  const rows = () => [...element().querySelectorAll<HTMLElement>('[data-member]')];
  const row = (id: string) => rows().find((one) => one.dataset['member'] === id) as HTMLElement;
  const text = (selector: string) => [...element().querySelectorAll(selector)].map((one) => one.textContent?.trim());
  const settle = async () => {
    await jest.advanceTimersByTimeAsync(1);
    fixture.detectChanges();
    await jest.advanceTimersByTimeAsync(1);
  };
  const press = async (id: string, key: string, more: KeyboardEventInit = {}) => {
    row(id).focus();
    row(id).dispatchEvent(new KeyboardEvent('keydown', { key, bubbles: true, ...more }));
    await settle();
  };
  const focused = () => (document.activeElement as HTMLElement).dataset['member'];

  async function open(roles: readonly Role[] = ['estimator']): Promise<void> {
    TestBed.configureTestingModule({
      providers: [
        words,
        provideRouter([]),
        { provide: ActivatedRoute, useValue: { queryParamMap: of(convertToParamMap({ member: ids.edge })) } },
        ...workspaceOn(server),
      ],
    });
    signIn(roles);
    store = TestBed.inject(EstimateStore);
    void store.open({ jobId: ids.job, estimateId: ids.estimate });
    await jest.advanceTimersByTimeAsync(1);
    fixture = TestBed.createComponent(MemberList);
    document.body.append(fixture.nativeElement as HTMLElement);
    await settle();
  }

  beforeEach(() => {
    jest.useFakeTimers();
    server = new EstimateServer();
  });
  afterEach(() => {
    element().remove();
    jest.useRealTimers();
  });

  it('shows each member with its shape, and how many or how long', async () => {
    await open();
    expect(text('.name')).toEqual(['Top edge', 'Leg']);
    expect(text('.about')).toEqual(['rectangle', 'straight leg']);
    expect(text('.amount')).toEqual(['1', '× 2']);
    expect(rows().map((one) => one.getAttribute('aria-current'))).toEqual(['true', null]);
  });

  it('is walked through with the arrows', async () => {
    await open();
    await press(ids.edge, 'ArrowDown');
    expect(focused()).toBe(ids.leg);
    await press(ids.leg, 'ArrowUp');
    expect(focused()).toBe(ids.edge);
  });

  it('moves a member with Alt and the arrows, and stays with it', async () => {
    await open();
    await press(ids.edge, 'ArrowDown', { altKey: true });
    expect([text('.name'), focused()]).toEqual([['Leg', 'Top edge'], ids.edge]);
    await press(ids.edge, 'ArrowUp', { altKey: true });
    expect(text('.name')).toEqual(['Top edge', 'Leg']);
  });

  it('removes a member without asking, and offers it back', async () => {
    await open();
    await press(ids.leg, 'Delete');
    expect([text('.name'), focused()]).toEqual([['Top edge'], ids.edge]);
    TestBed.inject(Notices).current()[0].action?.run();
    await settle();
    expect(text('.name')).toEqual(['Top edge', 'Leg']);
  });

  it('groups members by piece where there are several, and moves one into the next', async () => {
    const other = '018f0000-0000-7000-8000-000000000166';
    server.pieces.push({ id: other, version: 1, content: { name: 'Plinth', place: 5, note: '' } });
    await open();
    expect(text('.piece h3')).toEqual(['Base', 'Plinth']);
    await press(ids.leg, 'ArrowDown', { altKey: true });
    expect(store.members().find(({ id }) => id === ids.leg)?.pieceId).toBe(other);
    await press(ids.leg, 'ArrowUp', { altKey: true });
    expect(store.members().map(({ id, pieceId }) => [id, pieceId])).toEqual([
      [ids.edge, ids.piece],
      [ids.leg, ids.piece],
    ]);
  });

  describe('with two pieces', () => {
    const plinth = '018f0000-0000-7000-8000-000000000166';
    const heads = () => text('.piece h3');
    const moreOf = (pieceId: string) => element().querySelector<HTMLElement>(`[data-piece="${pieceId}"]`);
    /** What the pointer does in a browser; how it does it is looked at there (test/journeys). */
    const drop = async (from: number, to: number) => {
      const list = fixture.debugElement.query(By.directive(CdkDropList)).injector.get(CdkDropList);
      list.dropped.emit({ item: list.getSortedItems()[from], previousIndex: from, currentIndex: to } as never);
      await settle();
    };
    beforeEach(async () => {
      server.pieces.push({ id: plinth, version: 1, content: { name: 'Plinth', place: 5, note: 'oak' } });
      await open();
    });

    it('puts a piece with its members where it is dropped, in one step that can be taken back', async () => {
      await drop(1, 0);
      expect(heads()).toEqual(['Plinth', 'Base']);
      expect(store.members().map(({ id, pieceId }) => [id, pieceId])).toEqual([
        [ids.edge, ids.piece],
        [ids.leg, ids.piece],
      ]);
      await jest.advanceTimersByTimeAsync(700);
      expect(server.arrived).toHaveLength(1);
      expect(server.pieces.find(({ id }) => id === plinth)?.content).toEqual({
        name: 'Plinth',
        note: 'oak',
        place: expect.any(Number),
      });
      store.undo();
      await settle();
      expect(heads()).toEqual(['Base', 'Plinth']);
    });

    it('makes no step of a piece that is let go where it was', async () => {
      await drop(0, 0);
      expect([heads(), store.canUndo()]).toEqual([['Base', 'Plinth'], false]);
    });

    it('moves a piece with Alt and the arrows, stays at its button, and stops at the ends', async () => {
      const press = async (key: string) => {
        moreOf(ids.piece)?.focus();
        moreOf(ids.piece)?.dispatchEvent(new KeyboardEvent('keydown', { key, altKey: true, bubbles: true }));
        await settle();
        return [heads(), (document.activeElement as HTMLElement).dataset['piece']];
      };
      expect(await press('ArrowDown')).toEqual([['Plinth', 'Base'], ids.piece]);
      expect(await press('ArrowDown')).toEqual([['Plinth', 'Base'], ids.piece]);
      expect(await press('ArrowUp')).toEqual([['Base', 'Plinth'], ids.piece]);
    });

    it('moves a piece by its menu, for fingers', async () => {
      moreOf(plinth)?.click();
      await settle();
      const items = [...document.querySelectorAll<HTMLButtonElement>('.mat-mdc-menu-panel button')];
      items.find((one) => one.textContent?.trim() === 'Move up')?.click();
      await settle();
      expect(heads()).toEqual(['Plinth', 'Base']);
    });
  });

  it('takes hold of no piece while there is only one', async () => {
    await open();
    expect(element().querySelectorAll('.piece-head .grip')).toHaveLength(0);
    const [piece] = fixture.debugElement.query(By.directive(CdkDropList)).injector.get(CdkDropList).getSortedItems();
    expect(piece.disabled).toBe(true);
  });

  it('adds a member of the shape one chooses, at the end and of the same timber', async () => {
    await open();
    jest.spyOn(TestBed.inject(MatDialog), 'open').mockReturnValue({ afterClosed: () => of('bun-foot') } as never);
    [...element().querySelectorAll('button')].find((one) => one.textContent?.includes('Add a member'))?.click();
    await settle();
    await settle();
    const added = store.members().at(-1);
    expect([added?.name, added?.shape.kind, added?.timberId, added?.pieceId]).toEqual([
      'Bun foot',
      'bun-foot',
      'lime',
      ids.piece,
    ]);
  });

  it('adds a member for every pasted row, however many there were, in one step that can be taken back', async () => {
    await open();
    const contents = ['Frieze', 'Rail', 'Stile'].map((name, index) =>
      newMember({ pieceId: ids.piece, timberId: 'lime', place: 9000 + index, name, shape: shapeDefaults('rectangle') }),
    );
    jest.spyOn(TestBed.inject(MatDialog), 'open').mockReturnValue({ afterClosed: () => of(contents) } as never);
    (element().querySelector('.head button') as HTMLButtonElement).click();
    await settle();
    const paste = [...document.querySelectorAll<HTMLButtonElement>('.mat-mdc-menu-panel button')].find((one) =>
      one.textContent?.includes('Paste rows of a spreadsheet'),
    );
    paste?.click();
    await settle();
    await settle();
    expect(text('.name')).toEqual(['Top edge', 'Leg', 'Frieze', 'Rail', 'Stile']);
    await jest.advanceTimersByTimeAsync(700);
    expect(server.members.map(({ content }) => content.name)).toEqual(['Top edge', 'Leg', 'Frieze', 'Rail', 'Stile']);
    expect(server.arrived).toHaveLength(1);
    store.undo();
    await settle();
    expect(text('.name')).toEqual(['Top edge', 'Leg']);
  });

  it('begins an empty estimate with a piece', async () => {
    [server.pieces, server.members] = [[], []];
    await open();
    jest.spyOn(TestBed.inject(MatDialog), 'open').mockReturnValue({ afterClosed: () => of('sphere') } as never);
    [...element().querySelectorAll('button')].find((one) => one.textContent?.includes('Add a member'))?.click();
    await settle();
    await settle();
    await jest.advanceTimersByTimeAsync(700);
    expect(server.members.map((one) => one.content.pieceId)).toEqual(server.pieces.map(({ id }) => id));
    expect(server.arrived).toHaveLength(1);
  });

  it('lets the bench look, and change nothing', async () => {
    server.isPriced = false;
    await open(['bench']);
    await press(ids.leg, 'Delete');
    await press(ids.leg, 'ArrowUp', { altKey: true });
    expect(text('.name')).toEqual(['Top edge', 'Leg']);
    expect(element().querySelectorAll('.grip, [data-piece]')).toHaveLength(0);
    expect(element().textContent).not.toContain('Add a member');
  });
});
