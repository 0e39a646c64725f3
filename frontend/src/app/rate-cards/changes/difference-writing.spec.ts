import { TestBed } from '@angular/core/testing';
import { cardDifferences } from '#shared/rate-cards/card-differences';
import type { RateCard } from '#shared/rate-cards/rate-card';
import { startCard } from '#shared/rate-cards/start-card';
import type { CellPath } from '#shared/rate-cards/tables/cell-path';
import { withValueAt } from '#shared/rate-cards/tables/value-at';
import { signIn, words } from '../../../test/sign-in';
import { withRow, withRowMoved, withoutRow } from '../cells/with-rows';
import { DifferenceWriting } from './difference-writing';

const written = (after: RateCard) => {
  const groups = TestBed.inject(DifferenceWriting).groups(cardDifferences(startCard, after), {
    before: startCard,
    after,
  });
  return groups.flatMap(({ partId, lines }) =>
    lines.map(({ item, what, before, after: now }) => [partId, item, what, before, now]),
  );
};

const withValue = (path: CellPath, value: unknown): RateCard => withValueAt<RateCard>(startCard, path, value);

describe('A difference between two cards', () => {
  beforeEach(() => {
    TestBed.configureTestingModule({ providers: [words] });
    signIn(['owner'], { locale: 'de-AT' });
  });

  it.each<[string, RateCard, string[]]>([
    [
      'a rate of pay, with the currency and the decimal sign of the workshop',
      withValue(['money', 'grades', 2, 'costPerHour'], '36.50'),
      ['labour', 'Gilder', 'Cost an hour, €', '33,00', '36,50'],
    ],
    [
      'another grade for a stage, by its name',
      withValue(['carving', 'stages', 0, 'gradeId'], 'improver'),
      ['ornaments', 'Marking out', 'Grade', 'Carver', 'Improver'],
    ],
    [
      'a share kept in hundredths, in percent',
      withValue(['carving', 'stages', 0, 'share_hundredths'], 350),
      ['ornaments', 'Marking out', 'Share, %', '3', '3,5'],
    ],
    [
      'a figure of a grid, by its row',
      withValue(['leaf', 'losses', 'lays', 'breakage_percent', 'high'], 11),
      ['losses', 'lays', 'Breakage, high, %', '9', '11'],
    ],
    [
      'a duration',
      withValue(['buildUps', 'buildUps', 0, 'steps', 0, 'drying', 'beforeNext_minutes', 'likely'], 840),
      ['build-ups', 'Water gilding, burnished · Size coat', 'Before the next step, likely', '12 h', '14 h'],
    ],
    [
      'a choice, by its word',
      withValue(['money', 'profit', 'way'], 'mark-up'),
      ['money', '', 'Profit is a', 'margin, on price', 'mark-up, on cost'],
    ],
    [
      'a window that was closed and stands open',
      withValue(['buildUps', 'buildUps', 0, 'steps', 1, 'drying', 'latestCoat_minutes'], null),
      ['build-ups', 'Water gilding, burnished · Gesso', 'Next coat at the latest after', '18 h', '–'],
    ],
    [
      'a pack of leaf, which has no name of its own',
      withValue(['leaf', 'products', 0, 'breaks', 0, 'off_percent'], '6'),
      ['leaf', 'Gold 23½ ct, 80 mm, loose · Packs of leaf', 'Off the list, %', '5', '6'],
    ],
    [
      'a grade that is new',
      withRow(startCard, ['money', 'grades'], { at: 5, row: { id: 'turner', name: 'Turner', costPerHour: '30' } }),
      ['labour', 'Turner', 'new', '', ''],
    ],
    [
      'an item taken away',
      withoutRow(startCard, ['carving', 'items'], 0),
      ['ornaments', 'Leg from the block', 'taken away', '', ''],
    ],
  ])('tells %s', (_, after, line) => {
    expect(written(after)).toEqual([line]);
  });

  it('tells places that were changed', () => {
    const after = withRowMoved(startCard, ['money', 'terms', 'stages'], { from: 0, to: 1 });
    expect(written(after)).toEqual([
      ['money', 'Gilding finished', 'place in the list', '2', '1'],
      ['money', 'Carving approved', 'place in the list', '1', '2'],
    ]);
  });
});
