import { ChangeDetectionStrategy, Component, computed, inject, input, output } from '@angular/core';
import { recuttingManners } from '#shared/carving/carving-card';
import type { ProfileElement } from '#shared/measure/profile-element';
import { finishes, reliefs } from '#shared/measure/relief';
import {
  buildUpGroups,
  isBurnishedInPart,
  protectsEdge,
  StepChoice,
  takesLeaf,
  takesPaintedOrnament,
  takesRecutting,
} from '../../buildups';
import { Formats } from '../../core/formats/formats';
import { LayingForm, leafGroups } from '../../leaf';
import { finishNames, PartPicker, reliefNames } from '../../measure';
import { Entry } from '../../ui/field/entry';
import { EntryAt, type EntryChoice } from '../../ui/field/entry-at';
import { Field } from '../../ui/field/field';
import { EstimateStore } from '../estimate-store';
import type { MemberForm } from '../members/member-form';
import { MemberSelection } from '../members/member-selection';
import { alternativeChoices } from '../places/alternative-choices';
import type { ZoneRow } from './zone-row';

const recuttings: readonly EntryChoice[] = [
  { value: null, label: $localize`not recut` },
  ...recuttingManners.map((value) => ({
    value,
    label: value === 'plain' ? $localize`recut as usual` : $localize`in the French manner`,
  })),
];

/** Everything that is entered of one zone. */
@Component({
  selector: 'app-zone-form',
  imports: [Entry, EntryAt, Field, LayingForm, PartPicker, StepChoice],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './zone-form.html',
  styleUrl: './zone-form.scss',
})
export class ZoneForm {
  private readonly store = inject(EstimateStore);
  private readonly selection = inject(MemberSelection);
  private readonly formats = inject(Formats);

  readonly form = input.required<MemberForm>();
  readonly row = input.required<ZoneRow>();
  readonly buildUpPicked = output<string>();

  protected readonly recuttings = recuttings;
  protected readonly reliefs = reliefs.map((value) => ({ value, label: reliefNames[value] }));
  protected readonly zone = computed(() => this.row().zone);
  private readonly card = computed(() => this.store.card());
  protected readonly buildUps = computed(() => buildUpGroups(this.card()?.buildUps.buildUps ?? []));
  protected readonly leaves = computed(() => leafGroups(this.card()?.leaf.products ?? []));
  private readonly buildUp = computed(() =>
    this.card()?.buildUps.buildUps.find(({ id }) => id === this.zone().buildUpId),
  );
  protected readonly steps = computed(() => this.buildUp()?.steps ?? []);
  /** What this build-up has any use for. */
  protected readonly takes = computed(() => {
    const [buildUp, { recutting, protectedEdge_mm }] = [this.buildUp(), this.zone()];
    if (!buildUp) return { leaf: true, parted: false, painted: false, recutting: true, edge: true };
    return {
      leaf: takesLeaf(buildUp),
      parted: isBurnishedInPart(buildUp),
      painted: takesPaintedOrnament(buildUp),
      recutting: takesRecutting(buildUp) || recutting !== null,
      edge: protectsEdge(buildUp) || protectedEdge_mm > 0,
    };
  });
  protected readonly burnishedHint = computed(() => {
    const percent = this.card()?.buildUps.burnished_percent;
    return percent === undefined ? '' : $localize`${this.formats.figure('percent', percent)}:percent: unless said`;
  });
  protected readonly finishes = computed<readonly EntryChoice[]>(() => {
    const worked = this.zone().finish === null ? this.row().worked?.finish : undefined;
    const proposed = worked ? $localize`as it is: ${finishNames[worked].toLowerCase()}:finish:` : $localize`as it is`;
    return [{ value: null, label: proposed }, ...finishes.map((value) => ({ value, label: finishNames[value] }))];
  });
  protected readonly alternatives = computed(() => alternativeChoices(this.store.settings()));
  /** Parts of the girth, and the profile they are parts of. */
  protected readonly parts = computed(
    () => this.store.figures()?.members.find(({ memberId }) => memberId === this.selection.member()?.id)?.parts ?? [],
  );
  protected readonly profile = computed<readonly ProfileElement[]>(() => {
    const shape = this.selection.member()?.shape;
    return shape && 'profile' in shape ? shape.profile : [];
  });
  protected readonly takenBeside = computed(() =>
    (this.selection.member()?.zones ?? []).flatMap(({ id, take }) =>
      id !== this.zone().id && take.way === 'parts' ? take.parts : [],
    ),
  );
  protected readonly strips = computed(
    () => this.store.costed()?.cost.strips.find(({ zoneId }) => zoneId === this.zone().id)?.options ?? [],
  );
  /** Leaves of the zone for each leaf of one member. */
  protected readonly perZone = computed(() => {
    const leaf = this.row().worked?.leaf;
    const each = this.strips().find(({ strips }) => strips === leaf?.strips)?.leaves ?? 0;
    return leaf && each > 0 ? leaf.netLeaves / each : 1;
  });

  protected at(name: string): string {
    return `${this.row().path}.${name}`;
  }

  protected takeBy(way: string): void {
    const take = way === 'share' ? { way, share_percent: 100 } : { way: 'parts', parts: [] };
    this.form().put(this.at('take'), take);
  }

  protected takeParts(parts: readonly string[]): void {
    this.form().put(this.at('take'), { way: 'parts', parts });
  }

  protected doSteps(ids: readonly string[]): void {
    this.form().put(this.at('chosenStepIds'), ids);
  }
}
