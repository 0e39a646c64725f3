import { Injectable, computed, inject } from '@angular/core';
import type { ZoneOfMember } from '#shared/estimates/zones-of-lot';
import { groupedBy } from '#shared/units/grouped-by';
import type { Finding } from '#shared/words/finding';
import { gatheredFindings, type GatheredFinding } from '../../drying';
import { EstimateStore } from '../estimate-store';
import { DryLots } from './dry-lots';
import { isOfAir } from './is-of-air';

/** Told beside its step, not among what concerns the whole. */
const besideStep = ['drying-hold-', 'drying-missed-'];
/** What the drying of the whole job has to do with. */
const own = ['drying-', 'caution-', 'buildup-', 'carving-wood-dust'];

/** More zones than these are told by what is left out. */
const mostNamed = 4;

/** Members by their names, with the names of their zones where it is not all of them. */
function namesByMember(zones: readonly ZoneOfMember[]): string[] {
  return [...groupedBy(zones, ({ member }) => member)].map(([member, own]) =>
    own.length === member.zones.length ? member.name : `${member.name}, ${own.map(({ zone }) => zone.name).join(', ')}`,
  );
}

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

  /** Zones by their members, lots by their build-ups; of most zones those it does not hold of are said. */
  private namesOf(about: readonly string[]): string[] {
    const zones = this.lots.coated().flatMap((member) => member.zones.map((zone) => ({ member, zone })));
    const told = zones.filter(({ zone }) => about.includes(zone.id));
    const rest = zones.filter(({ zone }) => !about.includes(zone.id));
    if (rest.length === 0 && zones.length > 1) return [$localize`everywhere`];
    if (rest.length < told.length && told.length > mostNamed)
      return [$localize`everywhere but: ${namesByMember(rest).join('; ')}:where:`];
    const ofLots = this.lots.all().filter(({ lotId }) => about.includes(lotId));
    return [...namesByMember(told), ...ofLots.map(({ name }) => name)];
  }
}
