import type { Rejection } from '#shared/problems/rejection';
import { keepingOf } from './keeping';

const row = { workshopId: 'w', id: 'i', version: 3, title: 'Stand', note: '' };
const same = { title: 'Stand', note: '' };
const other = { title: 'Console', note: '' };

function decided(stands: typeof row | undefined, seen: number, content: object): string {
  try {
    return keepingOf(stands, seen, content).is;
  } catch (error) {
    return (error as Rejection).kind;
  }
}

describe('Keeping content', () => {
  it.each([
    ['under a new id is a first entry', undefined, 0, other, 'entry'],
    ['of a row that is gone is refused', undefined, 3, other, 'not-found'],
    ['on the version that stands is a change', row, 3, other, 'change'],
    ['that stands already changes nothing', row, 3, same, 'repeat'],
    ['sent once more after it was kept changes nothing', row, 2, same, 'repeat'],
    ['like what stands, but decided on an old version, is refused', row, 1, same, 'stale'],
    ['on an older version is refused', row, 2, other, 'stale'],
    ['as new under an id in use is refused', row, 0, other, 'stale'],
    ['on a version that never was is refused', row, 9, other, 'stale'],
    ['entered twice is kept once', { ...row, version: 1 }, 0, same, 'repeat'],
  ])('%s', (_sentence, stands, seen, content, decision) => {
    expect(decided(stands, seen, content)).toBe(decision);
  });

  it('shows what stands to whoever is refused as stale', () => {
    expect(() => keepingOf(row, 2, other)).toThrow(
      expect.objectContaining({ code: 'problem-stale', more: { detail: row } }),
    );
  });
});
