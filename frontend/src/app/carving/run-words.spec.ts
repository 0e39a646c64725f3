import { TestBed } from '@angular/core/testing';
import { signIn, words } from '../../test/sign-in';
import { RunWords } from './run-words';

describe('RunWords', () => {
  const make = (lengthUnit: 'mm' | 'in' = 'mm') => {
    TestBed.configureTestingModule({ providers: [words] });
    signIn(['owner'], { lengthUnit });
    return TestBed.inject(RunWords);
  };
  const plain = (text: string) => text.replace(/[\u00a0\u202f]/g, ' ');

  it.each([
    [0.0133, '16 repeats of 30.4 mm, stretched 1.3%'],
    [-0.0044, '16 repeats of 30.4 mm, pressed 0.4%'],
    [0.0001, '16 repeats of 30.4 mm, as drawn'],
  ])('says how repeats fall at a stretch of %d', (stretch, text) => {
    const fit = { repeats: 16, halves: 1 as const, free_mm: 486.4, pitch_mm: 30.4, stretch };
    expect(plain(make().ofFit(fit))).toBe(text);
  });

  it('says where they stand on either side of a centrepiece, and where there is no room', () => {
    const fit = { repeats: 8, halves: 2 as const, free_mm: 300, pitch_mm: 37.5, stretch: -0.0625 };
    const runWords = make();
    expect(runWords.ofFit(fit, { centre_mm: 60 })).toContain('half on either side of the centrepiece');
    expect(runWords.ofFit({ ...fit, repeats: 0 })).toBe('no room for a repeat');
  });

  it('writes an amount as it is counted, and what a run has besides its length', () => {
    const runWords = make();
    const run = { way: 'run', run_mm: 420, runs: 2, mitreLeaf_mm: 30, mitreLeaves: 2, centre_mm: 60 } as const;
    expect(plain(runWords.ofExtent({ way: 'pieces', count: 12 }))).toBe('12');
    expect(plain(runWords.ofExtent({ way: 'area', area_mm2: 34_000 }))).toBe('340 cm²');
    expect([plain(runWords.ofExtent(run)), runWords.ofRest(run)]).toEqual([
      '420 mm',
      '2 runs, 2 mitre leaves, centrepiece',
    ]);
  });
});
