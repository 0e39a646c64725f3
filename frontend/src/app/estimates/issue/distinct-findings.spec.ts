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
    expect(distinctFindings([note('zone-1'), note('zone-2'), note('zone-3', 'Size coat')])).toEqual([
      {
        finding: { kind: 'note', code: 'caution-glue-heat', values: { steps: 'Gesso' } },
        about: ['zone-1', 'zone-2'],
      },
      { finding: note('zone-3', 'Size coat'), about: ['zone-3'] },
    ]);
  });
});
