import type { Finding } from '#shared/words/finding';
import { gatheredFindings } from './gathered-findings';

const caution = (code: Finding['code'], steps: string, about: string): Finding => ({
  kind: 'caution',
  code,
  values: { steps },
  about,
});

describe('gatheredFindings', () => {
  it('says each danger once, with the steps of all and what it speaks of, whom to ask last', () => {
    const gathered = gatheredFindings([
      caution('caution-whiting-dust', 'Gesso, Smooth', 'zone-1'),
      { kind: 'caution', code: 'caution-defer', values: {}, about: 'zone-1' },
      caution('caution-whiting-dust', 'Gesso, Recut in gesso', 'zone-2'),
      { kind: 'caution', code: 'caution-defer', values: {}, about: 'zone-2' },
      caution('caution-solvents', 'Sealer', 'zone-2'),
    ]);
    expect(gathered.map(({ finding, about }) => [finding.code, finding.values['steps'], about])).toEqual([
      ['caution-whiting-dust', 'Gesso, Smooth, Recut in gesso', ['zone-1', 'zone-2']],
      ['caution-solvents', 'Sealer', ['zone-2']],
      ['caution-defer', undefined, ['zone-1', 'zone-2']],
    ]);
  });

  it('keeps apart what says different figures', () => {
    const joint = (thickness_mm: number, about: string): Finding => ({
      kind: 'note',
      code: 'buildup-allow-joints',
      values: { thickness_mm, socket_mm: 2 * thickness_mm },
      about,
    });
    const gathered = gatheredFindings([joint(0.48, 'a'), joint(0.72, 'b'), joint(0.48, 'c')]);
    expect(gathered.map(({ about }) => about)).toEqual([['a', 'c'], ['b']]);
  });
});
