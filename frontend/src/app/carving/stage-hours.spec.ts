import type { CarvingHoursRow } from '#shared/carving/carving-result';
import { gradeHours, stageHours } from './stage-hours';

const hours = (likely: number) => ({ low: likely / 2, likely, high: likely * 2 });
const rows: readonly CarvingHoursRow[] = [
  { kind: 'stage', stageId: 'bosting', gradeId: 'carver', hours: hours(4) },
  { kind: 'stage', stageId: 'detail', gradeId: 'master', hours: hours(2) },
  { kind: 'stage', stageId: 'blank', gradeId: 'improver', hours: hours(0) },
  { kind: 'undercutting', stageId: '', gradeId: 'master', hours: hours(1) },
];
const stages = [
  { id: 'bosting', name: 'Bosting' },
  { id: 'detail', name: 'Detail' },
];
const grades = [
  { id: 'carver', name: 'Carver' },
  { id: 'master', name: 'Master carver' },
];

describe('Hours of carving', () => {
  it('are named by stage, and by what is no stage, none of them empty', () => {
    expect(stageHours(rows, stages, grades).map(({ name, grade, hours: { likely } }) => [name, grade, likely])).toEqual(
      [
        ['Bosting', 'Carver', 4],
        ['Detail', 'Master carver', 2],
        ['Undercutting', 'Master carver', 1],
      ],
    );
  });

  it('are added up by grade, low, likely and high', () => {
    expect(gradeHours(rows, grades).map(({ name, hours: sum }) => [name, sum])).toEqual([
      ['Carver', { low: 2, likely: 4, high: 8 }],
      ['Master carver', { low: 1.5, likely: 3, high: 6 }],
    ]);
  });
});
