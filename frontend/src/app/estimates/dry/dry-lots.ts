import { Injectable, computed, inject } from '@angular/core';
import type { Member } from '#shared/estimates/member';
import { zonesOfLot, type ZoneOfMember } from '#shared/estimates/zones-of-lot';
import { groupedBy } from '#shared/units/grouped-by';
import type { WorkedHold, WorkedLot } from '../../drying';
import { EstimateStore } from '../estimate-store';

/** A lot as the place shows it: what it is of, and what is coated in it. */
export interface ShownLot extends WorkedLot {
  readonly pieceId: string;
  readonly buildUpId: string;
  /** As its members name it; empty where it is the proposed one. */
  readonly lot: string;
  readonly zones: readonly ZoneOfMember[];
  /** Its members in words. */
  readonly members: string;
}

const memberNames = (zones: readonly ZoneOfMember[]): string =>
  [...new Map(zones.map(({ member }) => [member.id, member.name])).values()].join(', ');

/** The lots of the estimate with their names, in the order they are served, and what they wait for. */
@Injectable()
export class DryLots {
  private readonly store = inject(EstimateStore);

  /** Names of the pieces, where there is more than one. */
  readonly pieces = computed<Readonly<Record<string, string>>>(() => {
    const pieces = this.store.pieces();
    return pieces.length > 1 ? Object.fromEntries(pieces.map(({ id, name }) => [id, name])) : {};
  });
  /** Members with those zones alone that the choice of alternatives leaves. */
  readonly coated = computed<readonly Member[]>(() => {
    const worked = new Set(this.store.figures()?.zones.map(({ zoneId }) => zoneId));
    return this.store
      .members()
      .map((member) => ({ ...member, zones: member.zones.filter(({ id }) => worked.has(id)) }));
  });
  readonly all = computed<readonly ShownLot[]>(() => {
    const dry = this.store.figures()?.dry;
    const tasks = groupedBy(dry?.tasks ?? [], ({ lotId }) => lotId);
    return (dry?.lots ?? []).map((worked) => {
      const zones = zonesOfLot(this.coated(), worked.lotId);
      const lot = zones.at(0)?.member.lot ?? '';
      const whose = [this.pieces()[worked.pieceId], lot].filter(Boolean).join(', ');
      const name = [whose, worked.buildUp].filter(Boolean).join(': ');
      return { ...worked, lot, zones, name, members: memberNames(zones), tasks: tasks.get(worked.lotId) ?? [] };
    });
  });
  /** Approvals that are waited for, what waits for the same at the same time together. */
  readonly holds = computed<readonly WorkedHold[]>(() => {
    const holds = this.store.figures()?.dry.holds ?? [];
    const together = groupedBy(holds, ({ hold, from_minutes }) => `${hold} ${from_minutes}`);
    const inOrder = [...together.values()].toSorted(([one], [other]) => one.from_minutes - other.from_minutes);
    return inOrder.flatMap((group) => {
      const [{ hold, from_minutes, to_minutes, usual_days }] = group;
      const waiting = group.flatMap(({ lotId, stepId }) => this.waiting(lotId, stepId));
      return [{ hold, from_minutes, to_minutes, usual_days, waiting }];
    });
  });
  readonly findings = computed(() => this.store.figures()?.findings ?? []);

  findingsOf(lotId: string) {
    return this.findings().filter(({ about }) => about === lotId);
  }

  private waiting(lotId: string, stepId: string): WorkedHold['waiting'] {
    const lot = this.all().find((one) => one.lotId === lotId);
    const step = lot?.steps.find((one) => one.stepId === stepId);
    if (!lot || !step) return [];
    const starts = lot.tasks.filter((task) => task.stepId === stepId).map((task) => task.start_minutes);
    return [{ lot: lot.name, step: step.name, start_minutes: starts.length > 0 ? Math.min(...starts) : null }];
  }
}
