import { ChangeDetectionStrategy, Component, computed, inject, input, linkedSignal, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { addDays } from '#shared/calendar/add-days';
import type { Climate } from '#shared/drying/climate';
import { millisecondsOf } from '#shared/programme/programme-frame';
import { Formats } from '../../core/formats/formats';
import { Words } from '../../core/formats/words';
import { Planner } from './planner';
import { ProgrammeStore } from './programme-store';
import { asItIs, WhatIfComparison, type AskedWay, type ComparedWay } from './what-if-comparison';

type Way = 'day' | 'hand' | 'cold' | 'lot';

export interface WhatIfLot {
  readonly lotId: string;
  readonly name: string;
}

interface Named {
  readonly id: string;
  readonly name: string;
}

const day_ms = 86_400_000;

/** Other ways side by side, by finish and cost: another start, one more person, a colder workshop, another build-up for a lot. */
@Component({
  selector: 'app-what-if-panel',
  imports: [MatButton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  providers: [Planner, WhatIfComparison],
  templateUrl: './what-if-panel.html',
  styleUrl: './what-if-panel.scss',
})
export class WhatIfPanel {
  private readonly store = inject(ProgrammeStore);
  protected readonly formats = inject(Formats);
  private readonly words = inject(Words);
  protected readonly comparison = inject(WhatIfComparison);

  readonly lots = input.required<readonly WhatIfLot[]>();
  readonly buildUps = input.required<readonly Named[]>();
  readonly shopAir = input<Climate>();

  private readonly on = signal<readonly Way[]>(['hand']);
  protected readonly day_ = linkedSignal(() => addDays(this.store.answer()?.inputs.day ?? '2000-01-01', 7));
  protected readonly isBackward = computed(() => this.store.answer()?.inputs.direction === 'backward');
  protected readonly dayLabel = computed(() =>
    this.isBackward() ? $localize`Another day it is wanted by` : $localize`Another start`,
  );
  protected readonly grades = computed<readonly Named[]>(() => {
    const items = this.store.answer()?.items ?? [];
    return [...new Map(items.map(({ gradeId, grade }) => [gradeId, { id: gradeId, name: grade }])).values()].filter(
      ({ id }) => id !== '',
    );
  });
  /** The grade with most to do is the one there is most use for. */
  protected readonly gradeId = linkedSignal(() => {
    const minutes = new Map<string, number>();
    for (const { gradeId, handsOn_minutes } of this.store.answer()?.items ?? [])
      minutes.set(gradeId, (minutes.get(gradeId) ?? 0) + handsOn_minutes);
    return [...minutes].sort(([, one], [, other]) => other - one).at(0)?.[0] ?? '';
  });
  protected readonly degrees_celsius = signal(14);
  protected readonly lotId = linkedSignal(() => this.lots().at(0)?.lotId ?? '');
  protected readonly buildUpId = linkedSignal(() => this.buildUps().at(0)?.id ?? '');
  protected readonly chosen = computed<readonly AskedWay[]>(() =>
    (['day', 'hand', 'cold', 'lot'] as const).filter((way) => this.on().includes(way)).map((way) => this.asked(way)),
  );
  protected readonly lines = computed(() => {
    const ways = this.comparison.ways();
    return ways.map((way) => this.line(way, ways[0]));
  });

  /** As it is ends later than what is kept says, since something of that is behind. */
  protected readonly isBehind = computed(() => {
    const [answer, frame, first] = [this.store.answer(), this.store.frame(), this.comparison.ways().at(0)];
    const kept = answer?.isCurrent ? answer.plan?.finish_minutes : undefined;
    if (!frame || !first?.readyAt || kept === undefined || kept === null) return false;
    return Date.parse(first.readyAt) > millisecondsOf(kept, frame);
  });

  protected isOn(way: Way): boolean {
    return this.on().includes(way);
  }

  protected tick(way: Way, isOn: boolean): void {
    this.on.update((before) => [...before.filter((one) => one !== way), ...(isOn ? [way] : [])]);
  }

  protected compare(): void {
    const answer = this.store.answer();
    if (!answer || this.chosen().length === 0) return;
    const ways = [{ name: $localize`As it is`, whatIf: asItIs }, ...this.chosen()];
    void this.comparison.compare(answer.estimateId, answer.inputs, ways);
  }

  private asked(way: Way): AskedWay {
    switch (way) {
      case 'day':
        return { name: this.dayName(this.formats.day(this.day_(), 'full')), whatIf: { ...asItIs, day: this.day_() } };
      case 'hand': {
        const grade = this.nameIn(this.grades(), this.gradeId());
        return { name: $localize`One more: ${grade}:grade:`, whatIf: { ...asItIs, furtherGradeIds: [this.gradeId()] } };
      }
      case 'cold':
        return {
          name: this.formats.figure('celsius', this.degrees_celsius()),
          whatIf: { ...asItIs, climate: this.air() },
        };
      case 'lot': {
        const lots = [{ lotId: this.lotId(), buildUpId: this.buildUpId() }];
        return { name: this.nameIn(this.buildUps(), this.buildUpId()), whatIf: { ...asItIs, lots } };
      }
    }
  }

  private dayName(day: string): string {
    return this.isBackward() ? $localize`Wanted by ${day}:day:` : $localize`Start ${day}:day:`;
  }

  private air(): Climate {
    const known = this.store.answer()?.inputs.climate ?? this.shopAir();
    return { temperature_celsius: this.degrees_celsius(), humidity_percent: known?.humidity_percent ?? 50 };
  }

  private line(way: ComparedWay, first: ComparedWay) {
    const { readyAt, findings, costDifference_minor: difference } = way;
    const why = findings.map(({ code, values }) => this.words.say(code, values)).join(' ');
    return {
      name: way.name,
      ready: readyAt
        ? `${this.formats.dayOf(readyAt, 'full')}, ${this.formats.time(readyAt)}`
        : $localize`cannot be planned`,
      later: readyAt ? this.later(readyAt, first.readyAt) : why,
      cost: this.formats.money(way.cost_minor),
      difference:
        difference === 0 ? '–' : this.formats.signed(difference, (size_minor) => this.formats.money(size_minor)),
    };
  }

  private later(readyAt: string, first: string | null): string {
    if (first === null) return '';
    const days = Math.round((Date.parse(readyAt) - Date.parse(first)) / day_ms);
    const text = this.formats.figure('days', Math.abs(days));
    return days === 0 ? '' : days > 0 ? $localize`${text}:days: later` : $localize`${text}:days: sooner`;
  }

  private nameIn(all: readonly Named[], id: string): string {
    return all.find((one) => one.id === id)?.name ?? id;
  }
}
