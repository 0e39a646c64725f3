import { windowBar } from './window-bar';

const task = {
  readyAt: '2027-05-07T08:00:00.000Z',
  startsAt: '2027-05-07T09:00:00.000Z',
  windowClosesAt: '2027-05-07T12:00:00.000Z',
};

describe('The bar of a window', () => {
  it.each([
    ['2027-05-07T07:00:00Z', 0, 'ahead'],
    ['2027-05-07T09:00:00Z', 25, 'open'],
    ['2027-05-07T13:00:00Z', 100, 'closed'],
  ])('at %s is %d %% over and %s', (now, over_percent, state) => {
    expect(windowBar(task, Date.parse(now))).toEqual({ over_percent, state });
  });

  it('opens with the task where nothing dries, and is none where nothing closes', () => {
    expect(windowBar({ ...task, readyAt: null }, Date.parse('2027-05-07T10:30:00Z'))?.over_percent).toBe(50);
    expect(windowBar({ ...task, windowClosesAt: null }, 0)).toBeNull();
  });
});
