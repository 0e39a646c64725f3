import { buildUpOnSize } from '#shared/programme/build-up-on-size';
import { startCard } from '#shared/rate-cards/start-card';

describe('A build-up on the size of another', () => {
  const buildUp = (id: string) => {
    const found = startCard.buildUps.buildUps.find((one) => one.id === id);
    if (!found) throw new Error(`${id} is not on the card`);
    return found;
  };
  const [quick, slow, water] = [buildUp('oil-3-hour'), buildUp('oil-12-hour'), buildUp('water-burnished')];
  const sizeOf = ({ steps }: typeof quick) => steps.find(({ kind }) => kind === 'oil-size');

  it('has the other size in place of its own, and every other step as it was', () => {
    const made = buildUpOnSize(quick, slow);
    expect(made && sizeOf(made)).toEqual({ ...sizeOf(slow), id: sizeOf(quick)?.id });
    const others = ({ steps }: typeof quick) => steps.filter(({ kind }) => kind !== 'oil-size');
    expect(made && others(made)).toEqual(others(quick));
    expect([quick.id, slow.id]).not.toContain(made?.id);
  });

  it('is not there where either is laid on no size', () => {
    expect(buildUpOnSize(water, slow)).toBeNull();
    expect(buildUpOnSize(slow, water)).toBeNull();
  });
});
