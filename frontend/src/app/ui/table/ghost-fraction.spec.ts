import { ghostFractions } from './ghost-fraction';

describe('ghostFractions', () => {
  it.each([
    ['fills up to the longest fraction', ['87.15', '27.7', '13'], '.', ['', '0', '.00']],
    ['knows the comma', ['87,15', '1.813'], ',', ['', ',00']],
    ['leaves whole figures alone where none has a fraction', ['38', '1,818'], '.', ['', '']],
    ['leaves words out of it', ['4.5', 'at call.', ''], '.', ['', '.0', '.0']],
    ['counts digits, not what stands before them', ['€ 1,234.50', '−3'], '.', ['', '.00']],
  ])('%s', (_, texts, sign, ghosts) => {
    expect(ghostFractions(texts, sign)).toEqual(ghosts);
  });
});
