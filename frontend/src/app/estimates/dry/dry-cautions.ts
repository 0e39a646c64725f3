import { Injectable, computed, inject } from '@angular/core';
import type { Finding } from '#shared/words/finding';
import { gatheredFindings, type GatheredFinding } from '../../drying';
import { EstimateStore } from '../estimate-store';
import { DryLots } from './dry-lots';
import { isOfAir } from './is-of-air';

/** Told beside its step, not among what concerns the whole. */
const besideStep = ['drying-hold-', 'drying-missed-'];
/** What the drying of the whole job has to do with. */
const own = ['drying-', 'caution-', 'buildup-', 'carving-wood-dust'];

/** What is to be told of drying and of the dangers of the work, each thing once, with where it holds. */
@Injectable()
export class DryCautions {
  private readonly store = inject(EstimateStore);
  private readonly lots = inject(DryLots);

  private readonly all = computed<readonly GatheredFinding[]>(() =>
    gatheredFindings(
      (this.store.figures()?.findings ?? []).filter(
        (finding) =>
          own.some((start) => finding.code.startsWith(start)) &&
          !besideStep.some((start) => finding.code.startsWith(start)) &&
          !isOfAir(finding),
      ),
    ),
  );
  readonly findings = computed(() => this.all().map(({ finding }) => finding));
  readonly where = (finding: Finding): string => {
    const about = this.all().find((one) => one.finding === finding)?.about ?? [];
    return this.namesOf(about).join('; ');
  };

  /** Zones by their members, lots by their build-ups; nothing where it holds of every zone. */
  private namesOf(about: readonly string[]): string[] {
    const members = this.store.members();
    const zones = members.flatMap((member) => member.zones.map((zone) => ({ id: zone.id, member, zone })));
    const told = zones.filter(({ id }) => about.includes(id));
    if (told.length === zones.length && zones.length > 1) return [$localize`everywhere`];
    const ofMembers = members.flatMap((member) => {
      const named = told.filter((one) => one.member === member).map(({ zone }) => zone.name);
      if (named.length === 0) return [];
      return named.length === member.zones.length ? [member.name] : [`${member.name}, ${named.join(', ')}`];
    });
    const ofLots = this.lots.all().filter(({ lotId }) => about.includes(lotId));
    return [...ofMembers, ...ofLots.map(({ name }) => name)];
  }
}
