import { Injectable, computed, inject } from '@angular/core';
import type { WorkedLot } from '../../drying';
import { EstimateStore } from '../estimate-store';

/** The lots of the estimate with their names, in the order they are served. */
@Injectable()
export class DryLots {
  private readonly store = inject(EstimateStore);

  /** Names of the pieces, where there is more than one. */
  readonly pieces = computed<Readonly<Record<string, string>>>(() => {
    const pieces = this.store.pieces();
    return pieces.length > 1 ? Object.fromEntries(pieces.map(({ id, name }) => [id, name])) : {};
  });
  readonly all = computed<readonly WorkedLot[]>(() => {
    const dry = this.store.figures()?.dry;
    return (dry?.lots ?? []).map((lot) => ({
      ...lot,
      name: [this.pieces()[lot.pieceId], lot.buildUp].filter(Boolean).join(': '),
      tasks: dry?.tasks.filter(({ lotId }) => lotId === lot.lotId) ?? [],
    }));
  });
  readonly findings = computed(() => this.store.figures()?.findings ?? []);

  findingsOf(lotId: string) {
    return this.findings().filter(({ about }) => about === lotId);
  }
}
