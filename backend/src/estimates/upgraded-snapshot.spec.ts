import { measuredWorkSchema } from '#shared/estimates/measured-work-schema';
import { paidFor } from '#shared/estimates/price/measured-work';
import type { Snapshot } from '#shared/estimates/snapshot';
import { smallDraft } from '../../../test/documents/sample-draft';
import { sampleSnapshot } from '../../../test/documents/sample-snapshot';
import { upgradedSnapshot } from './upgraded-snapshot';

const line = { id: 'x1', name: 'Rail', taxCategoryId: 'standard', memberId: null, alternativeId: null };
const frozenWith = (measured: unknown): Snapshot => {
  const extras = [
    { ...line, kind: 'paid-quantity', rule: 'as measured', quantity: '2', unit: 'm²', price: '3', measured },
  ];
  return sampleSnapshot(smallDraft({ extras: extras as never }));
};
const measuredIn = ({ draft }: Snapshot) => {
  const [extra] = draft.settings.extras;
  return extra.kind === 'paid-quantity' ? extra.measured : undefined;
};

describe('a snapshot frozen while a line took one measure', () => {
  it('is read with that measure as the first of several, and its texts', () => {
    const [length, girth] = [
      { text: '4 ft', mm: 1219.2 },
      { text: '80', mm: 80 },
    ];
    const before = frozenWith({ rule: 'plain-area', length, girth, area: null, sides: 1, worth: 1 });
    const measured = measuredIn(upgradedSnapshot(before));
    expect(measured).toEqual({
      rule: 'plain-area',
      measures: [{ count: 1, length_mm: 1219.2, girth_mm: 80, area_mm2: null, sides: 1, worth: 1 }],
      typed: { 'measures.0.length_mm': '4 ft', 'measures.0.girth_mm': '80' },
    });
    expect(measuredWorkSchema.safeParse(measured).success).toBe(true);
    expect(measured && paidFor(measured)?.quantity_mm2).toBeCloseTo(97_536, 6);
  });

  it('stays as it is where it has several, or none', () => {
    const measures = [{ count: 2, length_mm: null, girth_mm: null, area_mm2: 1e6, sides: 1, worth: 1 }];
    for (const measured of [{ rule: 'weighted', measures, typed: {} }, undefined]) {
      const before = frozenWith(measured);
      expect(upgradedSnapshot(before)).toEqual(before);
    }
  });
});
