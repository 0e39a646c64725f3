import { NgTemplateOutlet } from '@angular/common';
import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import type { ClientIssue } from '#shared/client-page/client-issue-schema';
import { groupedBy } from '#shared/units/grouped-by';
import { stripLayers } from '../buildups';
import { Formats } from '../core/formats/formats';
import { SectionStrip } from '../ui/drawing/section-strip';
import type { StripLayer } from '../ui/drawing/strip-layer';
import { ClientIssueStore } from './client-issue-store';

type Alternative = ClientIssue['alternatives'][number];
type BuildUp = ClientIssue['buildUps'][number];

interface Strip {
  readonly name: string;
  readonly layers: readonly StripLayer[];
}

/** The ways of doing part of it that are offered: of a group one is chosen, what stands by itself may be ticked. */
@Component({
  selector: 'app-client-choices',
  imports: [NgTemplateOutlet, SectionStrip],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './client-choices.html',
  styleUrl: './client-choices.scss',
})
export class ClientChoices {
  protected readonly store = inject(ClientIssueStore);
  private readonly formats = inject(Formats);

  private readonly offered = computed(() => this.store.issue()?.alternatives ?? []);
  protected readonly groups = computed(() =>
    [...groupedBy(this.grouped(), ({ group }) => group)].map(([name, options]) => ({
      ...{ name, options },
      base: this.baseOf(options),
    })),
  );
  protected readonly extras = computed(() => this.offered().filter(({ group }) => group === ''));
  protected readonly mayChoose = computed(() => this.store.mayAnswer() && this.store.issue()?.mayChoose === true);

  protected isChosen(id: string): boolean {
    return this.store.choice().includes(id);
  }

  protected hasBase(options: readonly Alternative[]): boolean {
    return !options.some(({ id }) => this.isChosen(id));
  }

  protected take(options: readonly Alternative[], chosen?: Alternative): void {
    const others = this.store.choice().filter((id) => !options.some((option) => option.id === id));
    this.store.choose(chosen ? [...others, chosen.id] : others);
  }

  protected tick(extra: Alternative, isTicked: boolean): void {
    const others = this.store.choice().filter((id) => id !== extra.id);
    this.store.choose(isTicked ? [...others, extra.id] : others);
  }

  /** What it is more or less than the base, with a true minus. */
  protected difference({ difference_minor }: Alternative): string {
    if (difference_minor === 0) return $localize`no difference`;
    return this.formats.signed(difference_minor, (size_minor) => this.formats.money(size_minor));
  }

  /** How long it takes, where that is another time than the base takes. */
  protected time({ weeks }: Alternative): string {
    const base = this.store.issue()?.price.weeks ?? weeks;
    if (weeks === base) return '';
    return weeks > base
      ? $localize`Takes longer: about ${weeks}:weeks: weeks instead of ${base}:base:.`
      : $localize`Ready sooner: about ${weeks}:weeks: weeks instead of ${base}:base:.`;
  }

  /** Build-ups, drawn as the section through their layers. */
  protected strips(buildUps: readonly BuildUp[]): Strip[] {
    return buildUps.map(({ buildUp, layers, leaf }) => ({
      name: buildUp,
      layers: stripLayers(
        layers.map((layer) => ({ ...layer, coats: layer.coats[1] })),
        { timber: $localize`Wood`, leaf: leaf.join(', ') },
      ),
    }));
  }

  /** What the base of a group is made of; named only where all of its options take the same one thing away. */
  private baseOf(options: readonly Alternative[]): Strip[] {
    const before = [...new Map(options.flatMap((option) => option.before).map((one) => [one.buildUp, one])).values()];
    return before.length === 1 ? this.strips(before) : [];
  }

  private grouped(): Alternative[] {
    return this.offered().filter(({ group }) => group !== '');
  }
}
