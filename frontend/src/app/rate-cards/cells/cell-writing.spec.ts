import { TestBed } from '@angular/core/testing';
import { startCard } from '#shared/rate-cards/start-card';
import { cellAt } from '#shared/rate-cards/tables/cell-at';
import { withValueAt } from '#shared/rate-cards/tables/value-at';
import type { RateCard } from '#shared/rate-cards/rate-card';
import { signIn, words } from '../../../test/sign-in';
import { CellWriting } from './cell-writing';

const path = ['leaf', 'products', 0, 'side_mm'] as const;

/** The side of a leaf as its cell shows it, the unit of its column, and what the cell is read back as. */
function shown(lengthUnit: 'mm' | 'in', side_mm: number) {
  signIn(['owner'], { lengthUnit });
  const writing = TestBed.inject(CellWriting);
  const column = cellAt(path)!.column;
  const card = withValueAt<RateCard>(startCard, path, side_mm);
  const text = writing.text({ column, path }, card);
  return { text, unit: writing.unit(column), read: writing.read({ column, path }, text, card) };
}

describe('CellWriting', () => {
  beforeEach(() => TestBed.configureTestingModule({ providers: [words] }));

  it.each([
    ['mm', 80, '80', 'mm'],
    ['mm', 80.123, '80.123', 'mm'],
    ['in', 85.725, '3 3/8 in', ''],
    ['in', 80, '80 mm', ''],
  ] as const)(
    'in %s writes a length of %d mm as “%s” under “%s”, and reads it back whole',
    (lengthUnit, mm, text, unit) => {
      expect(shown(lengthUnit, mm)).toEqual({ text, unit, read: { ok: true, value: mm } });
    },
  );

  it('names the unit of one figure as one, and of a column as several', () => {
    signIn();
    const writing = TestBed.inject(CellWriting);
    const column = cellAt(['drying', 'holds_days', 'carving-approved'])!.column;
    expect([writing.unit(column, 1), writing.unit(column, 1.5), writing.unit(column)]).toEqual([
      'working day',
      'working days',
      'working days',
    ]);
  });
});
