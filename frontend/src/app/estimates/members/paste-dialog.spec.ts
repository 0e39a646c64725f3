import { type ComponentFixture, TestBed } from '@angular/core/testing';
import { MAT_DIALOG_DATA, MatDialogRef } from '@angular/material/dialog';
import type { MemberContent } from '#shared/estimates/member';
import { signIn, words } from '../../../test/sign-in';
import { PasteDialog } from './paste-dialog';

describe('PasteDialog', () => {
  let fixture: ComponentFixture<PasteDialog>;
  let taken: readonly MemberContent[] | undefined;

  const element = () => fixture.nativeElement as HTMLElement;
  const plain = (one: Element) => one.textContent?.replace(/\s+/g, ' ').trim();
  const cells = () => [...element().querySelectorAll('tbody tr')].map((row) => [...row.children].map(plain));
  const addButton = () => element().querySelector('mat-dialog-actions button:last-child') as HTMLButtonElement;

  function paste(text: string, settings: Parameters<typeof signIn>[1] = {}): void {
    taken = undefined;
    const close = (contents: readonly MemberContent[]) => (taken = contents);
    TestBed.configureTestingModule({
      providers: [
        words,
        {
          provide: MAT_DIALOG_DATA,
          useValue: { pieceId: '018f0000-0000-7000-8000-000000000113', place: 100, timberId: 'lime' },
        },
        { provide: MatDialogRef, useValue: { close } },
      ],
    });
    signIn(['estimator'], settings);
    fixture = TestBed.createComponent(PasteDialog);
    fixture.detectChanges();
    const rows = element().querySelector('textarea') as HTMLTextAreaElement;
    rows.value = text;
    rows.dispatchEvent(new Event('input'));
    fixture.detectChanges();
  }

  it('shows the rows under the headings of the shape, and hands out a member for each', () => {
    paste('Frieze\t2\t86 cm\t120\nRail\t1\t400\t40\nStile\t4\t700\t40');
    expect([...element().querySelectorAll('th')].map(plain)).toEqual(['Name', 'How many', 'Length', 'Height']);
    expect(cells()).toEqual([
      ['Frieze', '2', '86 cm', '120'],
      ['Rail', '1', '400', '40'],
      ['Stile', '4', '700', '40'],
    ]);
    expect(plain(addButton())).toBe('Add 3 members');
    addButton().click();
    expect(taken?.map(({ name, count, place }) => [name, count, place])).toEqual([
      ['Frieze', 2, 100],
      ['Rail', 1, 1124],
      ['Stile', 4, 2148],
    ]);
  });

  it('leaves out a first row that says what the columns are called', () => {
    paste('Name\tHow many\tLength\tHeight\nFrieze\t2\t860\t120');
    expect(cells()).toEqual([['Frieze', '2', '860', '120']]);
    addButton().click();
    expect(taken?.map(({ name, place }) => [name, place])).toEqual([['Frieze', 100]]);
  });

  it('knows headings in any writing and where some are missing, and takes a member that only begins like one', () => {
    paste('NAME\thow many\n\nName of the rail\t1\t400\t40\nHeight\t1\t400\t40');
    expect(cells().map(([name]) => name)).toEqual(['Name of the rail', 'Height']);
  });

  it('names beside each bad cell what is wrong with it, and takes nothing until all is well', () => {
    paste('Frieze\t2\ta hand\t120\nRail\t1.5\t400\t200 m\n\t1\t400\t1,200');
    expect(cells()).toEqual([
      ['Frieze', '2', 'a hand Please write a length such as 860 mm, 86.0 cm.', '120'],
      ['Rail', '1.5 Whole numbers only.', '400', '200 m Must be less than 100000 mm.'],
      ['Please fill this in.', '1', '400', '1,200 Please leave out thousands separators; “.” is the decimal sign.'],
    ]);
    expect(element().querySelectorAll('td.wrong')).toHaveLength(5);
    expect(plain(element().querySelector('[role="status"]') as Element)).toBe('3 rows need another look.');
    expect(addButton().disabled).toBe(true);
    addButton().click();
    expect(taken).toBeUndefined();
  });

  it('reads the lengths in inches where one measures so', () => {
    paste('Frieze\t1\t33 7/8\t4', { lengthUnit: 'in' });
    addButton().click();
    // 33.875 in and 4 in of 25.4 mm.
    expect(taken?.[0]?.shape).toMatchObject({ length_mm: 860.425, height_mm: 101.6 });
  });
});
