import type { StripLayer } from '#shared/buildups/section-strip';
import { stripLayers } from './strip-layers';

const layer = (given: Partial<StripLayer>): StripLayer => ({
  stepId: '',
  name: '',
  coats: 1,
  colour: 'none',
  thickness: 0.5,
  thickness_mm: null,
  ...given,
});

describe('stripLayers', () => {
  it('puts the finish on top and the wood at the bottom, each under its own name', () => {
    const layers = stripLayers(
      [
        layer({ colour: 'wood', coats: 0, thickness: 6 }),
        layer({ colour: 'gesso', name: 'Gesso', coats: 8, thickness: 8 }),
        layer({ colour: 'red-bole', name: 'Red bole', coats: 3, thickness: 1.5 }),
        layer({ colour: 'gold', name: 'Wet and lay' }),
      ],
      { timber: 'Lime', leaf: 'Gold 23½ ct' },
    );
    expect(layers.map(({ label, count, tone }) => [label, count, tone])).toEqual([
      ['Gold 23½ ct', '1', 'gold'],
      ['Red bole', '3', 'red-bole'],
      ['Gesso', '8', 'gesso'],
      ['Lime', undefined, 'wood'],
    ]);
  });

  it('draws a ground thicker than a thin coat, and nothing thicker than twice', () => {
    const [thick, thin] = stripLayers(
      [layer({ colour: 'size', thickness: 0.3 }), layer({ colour: 'gesso', thickness: 11 })],
      { timber: '', leaf: '' },
    );
    expect(thick?.weight).toBe(2);
    expect(thin?.weight).toBeLessThan(1.1);
  });

  it('calls leaf what the step is called where no leaf is chosen', () => {
    const [only] = stripLayers([layer({ colour: 'leaf', name: 'Lay' })], { timber: '', leaf: '' });
    expect(only).toMatchObject({ label: 'Lay', tone: 'gold' });
  });
});
