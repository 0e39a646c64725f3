import { Injectable, computed, inject } from '@angular/core';
import { chosenDraft } from '#shared/estimates/chosen-draft';
import { estimateWork } from '#shared/estimates/estimate-work';
import type { ZoneFigures } from '#shared/estimates/figures';
import type { Zone } from '#shared/estimates/member';
import { workFigures } from '#shared/estimates/work-figures';
import { EstimateStore } from '../estimate-store';
import { MemberSelection } from '../members/member-selection';

/** The zones of the selected member that belong to alternatives which are not chosen, each worked as if its own was. */
@Injectable()
export class ZonesAside {
  private readonly store = inject(EstimateStore);
  private readonly selection = inject(MemberSelection);

  private readonly zones = computed<ReadonlyMap<string, ZoneFigures>>(() => {
    const choice = this.store.choice();
    const ids = this.selection.member()?.zones.flatMap(({ alternativeId }) => alternativeId ?? []) ?? [];
    const aside = [...new Set(ids)].filter((id) => !choice.includes(id));
    return new Map(aside.flatMap((id) => this.worked(id)).map((zone) => [zone.zoneId, zone]));
  });

  of({ id }: Zone): ZoneFigures | undefined {
    return this.zones().get(id);
  }

  private worked(alternativeId: string): readonly ZoneFigures[] {
    const [draft, card, memberId] = [this.store.draft(), this.store.card(), this.selection.member()?.id];
    if (!draft || !card) return [];
    const chosen = chosenDraft(draft, [...this.store.choice(), alternativeId]);
    const own = { ...chosen, members: chosen.members.filter(({ id }) => id === memberId) };
    const inAlternative = new Set(
      own.members.flatMap(({ zones }) =>
        zones.flatMap((zone) => (zone.alternativeId === alternativeId ? zone.id : [])),
      ),
    );
    const { zones } = workFigures(estimateWork(own, card), own.settings, card);
    return zones.filter(({ zoneId }) => inAlternative.has(zoneId));
  }
}
