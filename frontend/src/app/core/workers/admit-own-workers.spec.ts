import { ownWorkerAddress } from './admit-own-workers';

const origin = 'https://workshop.example';

describe('The policy for workers', () => {
  it('admits the workers our own build makes', () => {
    expect(ownWorkerAddress('/worker-AB12CD34.js', origin)).toBe('https://workshop.example/worker-AB12CD34.js');
    expect(ownWorkerAddress('https://workshop.example/worker-AB12CD34.js', origin)).toBe(
      'https://workshop.example/worker-AB12CD34.js',
    );
    expect(ownWorkerAddress('/client-files/worker-AB12CD34.js', origin)).toBe(
      'https://workshop.example/client-files/worker-AB12CD34.js',
    );
  });

  it.each([
    ['another site', 'https://elsewhere.example/worker-AB12CD34.js'],
    ['another file of ours', '/main-AB12CD34.js'],
    ['a file below a folder', '/uploads/worker-AB12CD34.js'],
    ['a path that climbs', '/worker-AB/../upload.js'],
    ['data', 'data:text/javascript,alert(1)'],
    ['a blob', 'blob:https://workshop.example/7b1c'],
  ])('refuses %s', (_, address) => {
    expect(() => ownWorkerAddress(address, origin)).toThrow(TypeError);
  });
});
