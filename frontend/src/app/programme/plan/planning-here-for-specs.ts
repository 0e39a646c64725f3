import type { PagePlanning } from '#shared/programme/page-planning';
import { programme } from '#shared/programme/programme';
import { programmeRemedies } from '#shared/programme/programme-remedies';

/** A worker that plans where it stands. */
export class PlanningHereForSpecs extends EventTarget {
  terminate(): void {
    return;
  }

  postMessage({ request, search, helpsTask, otherSizes = [] }: PagePlanning): void {
    const data =
      helpsTask === undefined
        ? { plan: programme(request, search) }
        : {
            remedies: programmeRemedies(request, helpsTask, { otherSizes, search: { ...search, limit: { nodes: 0 } } }),
          };
    queueMicrotask(() => this.dispatchEvent(new MessageEvent('message', { data })));
  }
}
