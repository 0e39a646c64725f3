import { Injectable, inject } from '@angular/core';
import type { BodyOf } from '#shared/actor/endpoint';
import {
  holdSlot,
  keepPlan,
  keepProgramme,
  readProgramme,
  readShop,
  readSolution,
  readWhatIf,
  releaseSlot,
  solveProgramme,
  stopSolution,
} from '#shared/programme/programme-endpoints';
import type { ProgrammeInputs } from '#shared/programme/programme-inputs';
import type { Programme } from '#shared/programme/programme-plan';
import type { WhatIf } from '#shared/programme/what-if';
import { markAsPlanned } from '#shared/programme/board-endpoints';
import { Api } from '../../core/api/api';

/** The calls about the programme of one estimate. */
@Injectable({ providedIn: 'root' })
export class ProgrammeClient {
  private readonly api = inject(Api);

  read(estimateId: string, signal: AbortSignal) {
    return this.api.call(readProgramme, { params: { estimateId }, signal });
  }

  async peopleNames(signal: AbortSignal): Promise<ReadonlyMap<string, string>> {
    const { content } = await this.api.call(readShop, { signal });
    return new Map(content.people.map(({ id, name }) => [id, name]));
  }

  keep(seen: { estimateId: string; version: number }, inputs: ProgrammeInputs) {
    const { estimateId, version } = seen;
    return this.api.call(keepProgramme, {
      params: { estimateId },
      body: inputs as BodyOf<typeof keepProgramme>,
      version,
    });
  }

  keepPlan(seen: { estimateId: string; version: number }, plan: Programme) {
    const { estimateId, version } = seen;
    return this.api.call(keepPlan, { params: { estimateId }, body: plan as BodyOf<typeof keepPlan>, version });
  }

  solve(estimateId: string, body: BodyOf<typeof solveProgramme>) {
    return this.api.call(solveProgramme, { params: { estimateId }, body });
  }

  solution(solutionId: string, signal: AbortSignal) {
    return this.api.call(readSolution, { params: { solutionId }, signal });
  }

  stop(solutionId: string) {
    return this.api.call(stopSolution, { params: { solutionId } });
  }

  whatIf(estimateId: string, asked: WhatIf) {
    return this.api.call(readWhatIf, { params: { estimateId }, body: asked as BodyOf<typeof readWhatIf> });
  }

  markAsPlanned(estimateId: string, taskIds: readonly string[]) {
    return this.api.call(markAsPlanned, { params: { estimateId }, body: { taskIds: [...taskIds] } });
  }

  hold(estimateId: string) {
    return this.api.call(holdSlot, { params: { estimateId } });
  }

  release(estimateId: string) {
    return this.api.call(releaseSlot, { params: { estimateId } });
  }
}
