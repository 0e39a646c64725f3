import { ribbonTask } from './ribbon-for-specs';
import { TaskDrag } from './task-drag';

describe('Moving a task by the pointer', () => {
  it('begins once it is more than a shake, and goes by quarters of an hour', () => {
    const drag = new TaskDrag();
    drag.begin(ribbonTask('lay', 480), 100);
    expect(drag.move(103, 10)).toBeUndefined();
    expect(drag.move(118, 10)).toEqual({ taskId: 'lay', start_minutes: 585 });
    expect(drag.move(118.4, 10)).toBeUndefined();
    expect(drag.end()).toEqual({ taskId: 'lay', start_minutes: 585 });
    expect(drag.at()).toBeUndefined();
  });

  it('is nothing where nothing was moved', () => {
    const drag = new TaskDrag();
    drag.begin(ribbonTask('lay', 480), 100);
    expect(drag.end()).toBeUndefined();
  });
});
