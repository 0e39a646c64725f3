import { Injectable, computed, effect, inject, signal } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { ActivatedRoute, Router } from '@angular/router';
import { map } from 'rxjs';
import type { Member } from '#shared/estimates/member';
import { EstimateStore } from '../estimate-store';

/** Which member the place shows; it stands in the address (`?member=`), and is kept as one goes from place to place. */
@Injectable()
export class MemberSelection {
  private readonly store = inject(EstimateStore);
  private readonly router = inject(Router);
  private readonly asked = toSignal(inject(ActivatedRoute).queryParamMap.pipe(map((params) => params.get('member'))), {
    requireSync: true,
  });
  private readonly last = signal<string | null>(null);

  /** The one asked for, else the last one, else the first; undefined in an empty estimate. */
  readonly member = computed<Member | undefined>(() => {
    const find = (id: string | null) => this.store.members().find((member) => member.id === id);
    return find(this.asked()) ?? find(this.last()) ?? this.store.members().at(0);
  });
  /** Whether the address names one: on a phone it is shown instead of the list. */
  readonly isChosen = computed(() => this.asked() !== null);

  private readonly whole = signal(false);
  /** Whether the place shows the whole job while no member is asked for. */
  readonly showsWhole = this.whole.asReadonly();
  /** The member the place shows; undefined where it shows the whole job. */
  readonly shown = computed(() => (this.showsWhole() && !this.isChosen() ? undefined : this.member()));

  constructor() {
    effect(() => {
      const asked = this.asked();
      if (asked !== null) this.last.set(asked);
    });
  }

  /** Says whether the place has something to show of the whole job. */
  showWhole(showsWhole: boolean): void {
    this.whole.set(showsWhole);
  }

  select(id: string): void {
    void this.go(id);
  }

  /** Back to the list, on a phone. */
  showList(): void {
    void this.go(null);
  }

  /** Whether the present place shows members at all. */
  isOnPlace(): boolean {
    return /\/(measure|carve|gild)(\?|$)/.test(this.router.url);
  }

  private go(member: string | null): Promise<boolean> {
    return this.router.navigate([], {
      queryParams: { member },
      queryParamsHandling: 'merge',
      replaceUrl: this.isChosen() && member !== null,
      scroll: 'manual',
    });
  }
}
