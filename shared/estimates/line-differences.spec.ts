import { lineDifferences, type NamedLines } from '#shared/estimates/line-differences';
import type { PriceLine } from '#shared/estimates/price/price';

const line = (id: string, price_minor: number, given: Partial<PriceLine> = {}): PriceLine => ({
  id,
  memberId: id.split('/')[0] ?? null,
  kind: 'carving',
  name: null,
  taxCategoryId: 'standard',
  price_minor,
  ...given,
});

const issue = (...lines: readonly PriceLine[]): NamedLines => ({ lines, memberNames: { leg: 'Leg', foot: 'Foot' } });

describe('Two prices of one estimate, line by line', () => {
  it('say nothing where they are alike', () => {
    expect(lineDifferences(issue(line('leg/carving', 100)), issue(line('leg/carving', 100)))).toEqual([]);
  });

  it('name what changed, what was added and what fell away', () => {
    const before = issue(line('leg/carving', 100), line('foot/carving', 40));
    const after = issue(line('leg/carving', 120), line('crate', 18, { memberId: null, name: 'Crate', kind: 'other' }));
    expect(lineDifferences(before, after)).toEqual([
      { lineId: 'leg/carving', member: 'Leg', kind: 'carving', name: null, before_minor: 100, after_minor: 120 },
      { lineId: 'crate', member: null, kind: 'other', name: 'Crate', before_minor: null, after_minor: 18 },
      { lineId: 'foot/carving', member: 'Foot', kind: 'carving', name: null, before_minor: 40, after_minor: null },
    ]);
  });

  it('call a member by the name it has now, and by its old one where it is gone', () => {
    const before = {
      lines: [line('leg/carving', 100), line('foot/carving', 40)],
      memberNames: { leg: 'Leg', foot: 'Foot' },
    };
    const after = { lines: [line('leg/carving', 90)], memberNames: { leg: 'Front leg' } };
    expect(lineDifferences(before, after).map(({ member }) => member)).toEqual(['Front leg', 'Foot']);
  });
});
