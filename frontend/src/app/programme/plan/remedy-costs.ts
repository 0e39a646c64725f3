import { Injectable, inject } from '@angular/core';
import { costOfRemedy } from '#shared/programme/cost-of-remedy';
import type { Remedy } from '#shared/programme/programme-remedies';
import type { ProgrammeAnswer } from '#shared/programme/programme-schema';
import type { WhatIf } from '#shared/programme/what-if';
import { Session } from '../../core/session/session';
import { ProgrammeClient } from './programme-client';
import { asItIs, frameOfWhatIf } from './what-if-comparison';

/** A remedy with what it costs the workshop beyond the estimate, in minor units; null for those who see no cost, and where it has no plan. */
export interface CostedRemedy extends Remedy {
  readonly cost_minor: number | null;
  /** The premium overtime was reckoned at. */
  readonly overtime_percent: number;
}

/** Reckons what remedies cost, by the rates of the card and, for another size, by the estimate worked on it; asks for nothing where cost may not be seen. */
@Injectable({ providedIn: 'root' })
export class RemedyCosts {
  private readonly client = inject(ProgrammeClient);
  private readonly session = inject(Session);

  async of(answer: ProgrammeAnswer, lotId: string, remedies: readonly Remedy[]): Promise<readonly CostedRemedy[]> {
    if (!this.session.may('owner', 'estimator'))
      return remedies.map((remedy) => ({ ...remedy, cost_minor: null, overtime_percent: 0 }));
    const asIs = await this.client.whatIf(answer.estimateId, asItIs);
    const { rates, setUp_hours, digits, overtime_percent } = asIs;
    const known = { request: answer.request, frame: frameOfWhatIf(asIs), rates, setUp_hours, digits, overtime_percent };
    const costed: CostedRemedy[] = [];
    for (const remedy of remedies) {
      const sizeDifference_minor = await this.sizeDifference(answer, lotId, remedy);
      const cost_minor = costOfRemedy(remedy, { ...known, sizeDifference_minor });
      costed.push({ ...remedy, cost_minor, overtime_percent });
    }
    return costed;
  }

  private async sizeDifference(
    answer: ProgrammeAnswer,
    lotId: string,
    { code, values, plan }: Remedy,
  ): Promise<number> {
    if (code !== 'programme-remedy-other-size' || plan.finish_minutes === null) return 0;
    const size = answer.otherSizes.find((one) => one.lotId === lotId && one.name === values['size']);
    if (!size) return 0;
    const asked: WhatIf = { ...asItIs, lots: [{ lotId, buildUpId: size.buildUpId, onlySize: true }] };
    return (await this.client.whatIf(answer.estimateId, asked)).costDifference_minor;
  }
}
