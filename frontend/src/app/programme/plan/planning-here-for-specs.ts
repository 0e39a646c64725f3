import type { PagePlanning } from '#shared/programme/page-planning';
import { programme } from '#shared/programme/programme';

/** A worker that plans where it stands. */
export class PlanningHereForSpecs extends EventTarget {
  terminate(): void {
    return;
  }

  postMessage({ request, search }: PagePlanning): void {
    const plan = programme(request, search);
    queueMicrotask(() => this.dispatchEvent(new MessageEvent('message', { data: { plan } })));
  }
}
