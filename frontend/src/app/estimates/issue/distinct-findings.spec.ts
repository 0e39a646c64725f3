import type { Finding } from '#shared/words/finding';
import { distinctFindings } from './distinct-findings';

const note = (about: string, steps = 'Gesso'): Finding => ({
  kind: 'note',
  code: 'caution-glue-heat',
  values: { steps },
  about,
});

describe('distinctFindings', () => {
  it('tells once what is said of several things, leading to none of them, and knows of which', () => {
    const other: Finding = { kind: 'note', code: 'buildup-one-batch', values: {}, about: 'zone-3' };
    expect(distinctFindings([note('zone-1'), other, note('zone-2')])).toEqual([
      {
        finding: { kind: 'note', code: 'caution-glue-heat', values: { steps: 'Gesso' } },
        about: ['zone-1', 'zone-2'],
      },
      { finding: other, about: ['zone-3'] },
    ]);
  });

  it('tells a danger once, with the steps of every build-up', () => {
    expect(distinctFindings([note('zone-1', 'Size coat, Gesso'), note('zone-2', 'Gesso, Bole')])).toEqual([
      {
        finding: { kind: 'note', code: 'caution-glue-heat', values: { steps: 'Size coat, Gesso, Bole' } },
        about: ['zone-1', 'zone-2'],
      },
    ]);
  });
});
