import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { MatButton } from '@angular/material/button';
import type { OrnamentWay } from '#shared/carving/ornament';
import type { OrnamentExtent } from '#shared/carving/ornament-use';
import { Formats } from '../core/formats/formats';
import type { AnyDocumentForm } from '../core/forms/document-form';
import { EntryAt } from '../ui/field/entry-at';
import { Entry } from '../ui/field/entry';
import { Field } from '../ui/field/field';
import { extentOf, fittingWays } from './fitting-extent';

type ExtentWay = OrnamentExtent['way'];

const wayNames: Readonly<Record<ExtentWay, string>> = {
  pieces: $localize`By the piece`,
  run: $localize`Along a run`,
  area: $localize`By area`,
};

/** How much of an ornament: pieces, runs with their mitre leaves and centrepiece, or an area. Its entries stand in the grid around it. */
@Component({
  selector: 'app-extent-form',
  imports: [Entry, EntryAt, Field, MatButton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (ways().length > 1) {
      <app-field i18n-label label="Counted">
        <select #chosen appEntry (change)="turn(chosen.value)">
          @for (way of ways(); track way) {
            <option [value]="way" [selected]="way === kind()">{{ names[way] }}</option>
          }
        </select>
      </app-field>
    }
    @switch (kind()) {
      @case ('pieces') {
        <app-entry-at way="number" i18n-label label="Pieces on one member" [form]="form()" [path]="at('count')" />
      }
      @case ('area') {
        <app-entry-at way="area" i18n-label label="Area on one member" [form]="form()" [path]="at('area_mm2')" />
      }
      @case ('run') {
        <app-entry-at way="length" i18n-label label="Length of a run" [form]="form()" [path]="at('run_mm')" />
        <app-entry-at way="number" i18n-label label="Runs on one member" [form]="form()" [path]="at('runs')" />
        <app-entry-at
          way="number"
          i18n-label
          label="Mitre leaves on a run"
          [form]="form()"
          [path]="at('mitreLeaves')"
        />
        <app-entry-at
          way="length"
          i18n-label
          label="Length of a mitre leaf"
          [form]="form()"
          [path]="at('mitreLeaf_mm')"
        />
        <app-entry-at way="length" optional i18n-label label="Centrepiece" [form]="form()" [path]="at('centre_mm')" />
        @if (otherRun(); as length) {
          <p class="other">
            <span i18n>The member’s run is {{ length }}.</span>
            <button matButton type="button" class="no-print" (click)="takeRun()" i18n>Take it</button>
          </p>
        }
      }
    }
  `,
  styles: `
    :host {
      display: contents;
    }

    .other {
      grid-column: 1 / -1;
    }
  `,
})
export class ExtentForm {
  private readonly formats = inject(Formats);

  readonly form = input.required<AnyDocumentForm>();
  /** Where the amount stands in the document. */
  readonly path = input.required<string>();
  /** What the ornament is counted by. */
  readonly way = input.required<OrnamentWay>();
  /** Length of the member's own run, to begin with. */
  readonly memberRun_mm = input(0);

  protected readonly names = wayNames;
  protected readonly kind = computed<ExtentWay>(() => this.form().value<OrnamentExtent>(this.path())?.way ?? 'pieces');
  /** What fits the ornament, and what stands there though it does not. */
  protected readonly ways = computed(() => [...new Set([...fittingWays(this.way()), this.kind()])]);

  /** The member's run where one run along it has another length; part of it may be meant, so it is only offered. */
  protected readonly otherRun = computed(() => {
    const [extent, run_mm] = [this.form().value<OrnamentExtent>(this.path()), this.memberRun_mm()];
    const isMeant = extent?.way !== 'run' || extent.runs > 1 || run_mm === 0;
    return isMeant || Math.abs(extent.run_mm - run_mm) <= run_mm / 100 ? '' : this.formats.length(run_mm);
  });

  protected at(name: string): string {
    return `${this.path()}.${name}`;
  }

  protected takeRun(): void {
    this.form().put(this.at('run_mm'), this.memberRun_mm());
  }

  protected turn(way: string): void {
    this.form().put(this.path(), extentOf(way as ExtentWay, this.memberRun_mm()));
  }
}
