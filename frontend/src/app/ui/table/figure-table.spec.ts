import { ChangeDetectionStrategy, Component, signal } from '@angular/core';
import { type ComponentFixture, TestBed } from '@angular/core/testing';
import { signIn, words } from '../../../test/sign-in';
import { Explanation } from '../figure/explanation';
import type { EditedCell, FigureColumn, MovedRow, PastedCells } from './figure-column';
import { FigureTable } from './figure-table';

interface Zone {
  readonly id: string;
  readonly name: string;
  readonly leaves: string;
}

@Component({
  selector: 'app-test-zones',
  imports: [FigureTable],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-figure-table
      i18n-caption
      caption="Zones"
      selectable
      [movable]="movable()"
      [columns]="columns"
      [rows]="rows()"
      [rowId]="rowId"
      [totals]="{ leaves: '55.25' }"
      [(chosen)]="chosen"
      (edited)="edits.push($event)"
      (pasted)="pastes.push($event)"
      (moved)="moves.push($event)"
    />
  `,
})
class TestZones {
  readonly rows = signal<readonly Zone[]>([
    { id: 'a', name: 'Ovolo', leaves: '41.9' },
    { id: 'b', name: 'Fillet', leaves: '13' },
  ]);
  readonly columns: readonly FigureColumn<Zone>[] = [
    { key: 'name', heading: 'Zone', kind: 'text', text: ({ name }) => name, editable: true },
    {
      key: 'leaves',
      heading: 'Leaves',
      kind: 'figure',
      text: ({ leaves }) => leaves,
      explained: ({ id, leaves }) => ({ id, heading: `${leaves} leaves`, reasons: [] }),
    },
  ];
  readonly rowId = ({ id }: Zone): string => id;
  readonly chosen = signal<string | undefined>(undefined);
  readonly edits: EditedCell[] = [];
  readonly pastes: PastedCells[] = [];
  readonly movable = signal(true);
  readonly moves: MovedRow[] = [];
}

describe('FigureTable', () => {
  let fixture: ComponentFixture<TestZones>;
  const element = () => fixture.nativeElement as HTMLElement;
  const current = () => element().querySelector<HTMLElement>('td[tabindex="0"]')!;
  const editor = () => element().querySelector('input');

  const press = async (...keys: string[]) => {
    for (const key of keys) {
      (editor() ?? current()).dispatchEvent(new KeyboardEvent('keydown', { key, bubbles: true, cancelable: true }));
      await fixture.whenStable();
    }
  };

  const type = (text: string) => {
    editor()!.value = text;
  };

  beforeEach(async () => {
    TestBed.configureTestingModule({ providers: [words] });
    signIn();
    fixture = TestBed.createComponent(TestZones);
    document.body.append(element());
    await fixture.whenStable();
  });

  afterEach(() => element().remove());

  it('brings the decimal signs of a column under one another, the bottom line included', () => {
    const ghosts = [...element().querySelectorAll('.ghost')].map((ghost) => ghost.textContent);
    expect(ghosts).toEqual(['0', '.00', '', '']);
  });

  it('is moved through with the arrow keys, one cell being the one to tab to', async () => {
    await press('ArrowDown', 'ArrowRight');
    expect(current().textContent?.trim()).toBe('13.00');
    expect(document.activeElement).toBe(current());
    expect(element().querySelectorAll('td[tabindex="0"]')).toHaveLength(1);
  });

  it('hands out what was typed into a cell and goes on to the one below', async () => {
    await press('Enter');
    type('Ovolo, egg and dart');
    await press('Enter');
    expect(fixture.componentInstance.edits).toEqual([{ rowId: 'a', key: 'name', text: 'Ovolo, egg and dart' }]);
    expect([editor(), current().textContent?.trim()]).toEqual([null, 'Fillet']);
  });

  it('begins with the first letter typed, and takes it back with Escape', async () => {
    await press('X');
    expect(editor()?.value).toBe('X');
    await press('Escape');
    expect([editor(), fixture.componentInstance.edits]).toEqual([null, []]);
  });

  it('hands nothing out when nothing changed', async () => {
    await press('F2', 'Tab');
    expect(fixture.componentInstance.edits).toEqual([]);
  });

  it('lets nobody type into a worked figure, but explains it', async () => {
    await press('ArrowRight', '9');
    expect(editor()).toBeNull();
    await press('Enter');
    expect(TestBed.inject(Explanation).current()?.heading).toBe('41.9 leaves');
  });

  it('takes rows of a spreadsheet at the cell one stands in', async () => {
    const event = Object.assign(new Event('paste', { bubbles: true, cancelable: true }), {
      clipboardData: { getData: () => 'Cove\t12\nBead\t4' },
    });
    await press('ArrowDown');
    current().dispatchEvent(event);
    expect(fixture.componentInstance.pastes).toEqual([
      {
        rowId: 'b',
        keys: ['name', 'leaves'],
        lines: [
          ['Cove', '12'],
          ['Bead', '4'],
        ],
      },
    ]);
    expect(event.defaultPrevented).toBe(true);
  });

  it('chooses a row by clicking or with the space bar', async () => {
    element().querySelectorAll<HTMLElement>('tbody td')[2].click();
    await fixture.whenStable();
    expect(fixture.componentInstance.chosen()).toBe('b');
    await press('ArrowUp', ' ');
    expect(fixture.componentInstance.chosen()).toBe('a');
  });

  it('takes what fast fingers typed and finished before the editor was there', async () => {
    for (const key of ['A', ' ', 'b', 'Enter'])
      current().dispatchEvent(new KeyboardEvent('keydown', { key, bubbles: true, cancelable: true }));
    await fixture.whenStable();
    expect(fixture.componentInstance.edits).toEqual([{ rowId: 'a', key: 'name', text: 'A b' }]);
  });

  const pressWithAlt = async (key: string) => {
    current().dispatchEvent(new KeyboardEvent('keydown', { key, altKey: true, bubbles: true, cancelable: true }));
    await fixture.whenStable();
  };

  it('hands out a row that is to change places with Alt and the arrows, never past an end', async () => {
    await pressWithAlt('ArrowUp');
    await pressWithAlt('ArrowDown');
    expect(fixture.componentInstance.moves).toEqual([{ rowId: 'a', from: 0, to: 1 }]);
  });

  it('leaves rows where they are where their order is not one’s own', async () => {
    fixture.componentInstance.movable.set(false);
    await fixture.whenStable();
    await pressWithAlt('ArrowDown');
    expect(fixture.componentInstance.moves).toEqual([]);
    expect(element().querySelector('.grip')).toBeNull();
  });

  it('opens a grouped figure as one would type it', async () => {
    Object.assign(fixture.componentInstance.columns[1], { editable: true, explained: undefined });
    fixture.componentInstance.rows.set([{ id: 'a', name: 'Ovolo', leaves: '12,345.6 cm²' }]);
    await fixture.whenStable();
    await press('ArrowRight', 'Enter');
    expect(editor()?.value).toBe('12345.6 cm²');
    await press('Enter');
    expect(fixture.componentInstance.edits).toEqual([]);
  });
});

@Component({
  selector: 'app-test-ways',
  imports: [FigureTable],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-figure-table
      i18n-caption
      caption="Ways"
      [columns]="columns"
      [rows]="rows"
      [rowId]="rowId"
      (edited)="edits.push($event)"
    />
  `,
})
class TestWays {
  readonly rows = [{ id: 'a', way: 'lays' }];
  readonly columns: readonly FigureColumn<{ way: string }>[] = [
    {
      key: 'way',
      heading: 'Way',
      kind: 'text',
      text: ({ way }) => way,
      editable: true,
      choices: () => ['sheets', 'lays', 'patches'],
    },
  ];
  readonly rowId = ({ id }: { id: string }): string => id;
  readonly edits: EditedCell[] = [];
}

describe('A cell with choices', () => {
  let fixture: ComponentFixture<TestWays>;
  const element = () => fixture.nativeElement as HTMLElement;
  const chooser = () => element().querySelector('select');
  const press = async (key: string) => {
    const target = chooser() ?? element().querySelector<HTMLElement>('td[tabindex="0"]')!;
    target.dispatchEvent(new KeyboardEvent('keydown', { key, bubbles: true, cancelable: true }));
    await fixture.whenStable();
  };

  beforeEach(async () => {
    TestBed.configureTestingModule({ providers: [words] });
    signIn();
    fixture = TestBed.createComponent(TestWays);
    document.body.append(element());
    await fixture.whenStable();
  });

  afterEach(() => element().remove());

  it('offers them with the present one chosen, by Enter as by typing', async () => {
    await press('s');
    expect(chooser()?.value).toBe('lays');
    expect([...chooser()!.options].map(({ value }) => value)).toEqual(['sheets', 'lays', 'patches']);
    expect(document.activeElement).toBe(chooser());
  });

  it('hands out what is chosen at once, and only once', async () => {
    await press('Enter');
    chooser()!.value = 'patches';
    chooser()!.dispatchEvent(new Event('change'));
    await fixture.whenStable();
    expect(fixture.componentInstance.edits).toEqual([{ rowId: 'a', key: 'way', text: 'patches' }]);
  });

  it('leaves everything as it was by Escape', async () => {
    await press('Enter');
    await press('Escape');
    expect([chooser(), fixture.componentInstance.edits]).toEqual([null, []]);
  });
});
