import { Injectable, computed, inject } from '@angular/core';
import { Session } from '../../core/session/session';
import type { RibbonLot } from '../ribbon/ribbon-lot';
import { openSpans } from './open-spans';
import { programmeLots } from './programme-lots';
import { ProgrammeStore } from './programme-store';
import { TaskWords } from './task-words';

/** What of a programme is drawn: its lines, and when somebody works. */
@Injectable()
export class ShownProgramme {
  private readonly store = inject(ProgrammeStore);
  private readonly session = inject(Session);
  private readonly words = inject(TaskWords);

  readonly lots = computed<readonly RibbonLot[]>(() => {
    const [answer, plan, frame] = [this.store.answer(), this.store.plan(), this.store.frame()];
    if (!answer || !plan || !frame) return [];
    const pins = this.store.proposal()?.inputs?.pins ?? answer.inputs.pins;
    const shown = {
      ...{ plan, frame, items: answer.items, marks: answer.marks, people: this.store.people() },
      pinnedIds: new Set(pins.map(({ taskId }) => taskId)),
      mayMove: this.session.may('owner', 'estimator'),
    };
    return programmeLots(shown, this.words);
  });
  readonly open = computed(() => {
    const [request, plan] = [this.store.answer()?.request, this.store.plan()];
    if (!request) return [];
    const last = Math.max(plan?.finish_minutes ?? 0, request.start_minutes);
    return openSpans(request.calendar, Math.ceil(last / 1440) + 60);
  });
}
