import { inputBinding } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { SectionStrip } from './section-strip';
import type { StripLayer } from './strip-layer';

const layers: readonly StripLayer[] = [
  { label: 'leaf 23½ ct, burnished', count: '1', tone: 'gold' },
  { label: 'gesso', count: '6', tone: 'gesso', weight: 9 },
  { label: 'lime', tone: 'wood' },
];

describe('SectionStrip', () => {
  it('stacks the layers without a gap, none thicker than twice a thin coat, and says them in words', async () => {
    const fixture = TestBed.createComponent(SectionStrip, { bindings: [inputBinding('layers', () => layers)] });
    await fixture.whenStable();
    const picture = (fixture.nativeElement as HTMLElement).querySelector('svg')!;
    const rects = [...picture.querySelectorAll('g > rect:first-child')].map((rect) =>
      [rect.getAttribute('y'), rect.getAttribute('height')].map(Number),
    );
    expect(rects).toEqual([
      [0, 22],
      [22, 44],
      [66, 22],
    ]);
    expect(picture.getAttribute('height')).toBe('88');
    expect(picture.getAttribute('aria-label')).toBe('leaf 23½ ct, burnished (1); gesso (6); lime');
  });
});
