import type { RibbonLot, RibbonTask } from './ribbon-lot';

/** A task of one hour, unless told otherwise. */
export const ribbonTask = (id: string, start_minutes: number, change: Partial<RibbonTask> = {}): RibbonTask => {
  const span = { start_minutes, end_minutes: start_minutes + 60 };
  return {
    ...{ id, name: id, label: id, ...span, spans: [span], dryUntil_minutes: null, window: null },
    ...{ look: 'planned', isPinned: false, isCritical: false, isMovable: true, story: [`${id} – lot`, 'At eight.'] },
    ...change,
  };
};

export const ribbonLot = (id: string, tasks: readonly RibbonTask[]): RibbonLot => ({
  ...{ id, name: id, minor: '', link: null },
  tasks,
});

/** As many lots with as many steps, an hour of work each and five between. */
export const ribbonForSpecs = (lots: number, steps: number): RibbonLot[] =>
  Array.from({ length: lots }, (_, lot) =>
    ribbonLot(
      `lot ${lot}`,
      Array.from({ length: steps }, (_step, step) => ribbonTask(`${lot}/${step}`, lot * 30 + step * 360)),
    ),
  );

/** Nothing changes its size in a test. */
export class StillObserver {
  observe(): void {
    return;
  }
  unobserve(): void {
    return;
  }
  disconnect(): void {
    return;
  }
}
