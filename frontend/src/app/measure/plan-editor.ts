import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import type { MouldingPlan, PolygonPlan } from '#shared/measure/moulding-shape';
import { planClosure } from '#shared/measure/plan-closure';
import type { AnyDocumentForm } from '../core/forms/document-form';
import { Formats } from '../core/formats/formats';
import { Words } from '../core/formats/words';
import { EntryAt } from '../ui/field/entry-at';
import { changedPlan } from './changed-plan';
import { ChoiceEntry } from './choice-entry';
import { offeredIn } from './first-shape';
import { RowsEditor } from './rows-editor';
import type { ShapeEntry } from './shape-entries';

type PlanForm = MouldingPlan['form'];

const sideLength: ShapeEntry = { path: '', label: $localize`Length`, way: 'length' };
const turn: ShapeEntry = { path: '', label: $localize`Turn`, way: 'number', unit: '°' };

/** The plan a moulding runs along: straight lengths with returns, a sweep, an oval, or sides that meet in mitres. */
@Component({
  selector: 'app-plan-editor',
  imports: [ChoiceEntry, EntryAt, RowsEditor],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './plan-editor.html',
  styles: `
    .pair {
      display: grid;
      gap: 16px 32px;
      grid-template-columns: repeat(auto-fit, minmax(min(100%, 260px), 1fr));
    }

    .complaint {
      color: var(--wrong);
    }

    .remark {
      color: var(--warn);
      font-size: 0.9375rem;
    }
  `,
})
export class PlanEditor {
  private readonly words = inject(Words);
  private readonly formats = inject(Formats);
  /** Plans as they were when another form was chosen: who goes back finds them again. */
  private readonly left = new Map<string, MouldingPlan>();

  readonly form = input.required<AnyDocumentForm>();
  /** Where the moulding stands in the document. */
  readonly path = input.required<string>();
  readonly isDisabled = input(false);

  protected readonly plan = computed(() => this.form().value<MouldingPlan>(`${this.path()}.plan`));
  protected readonly complaint = computed(() => this.form().message(`${this.path()}.plan`));
  /** That the sides miss each other, where they are said to meet; the figures stand all the same. */
  protected readonly gap = computed(() => {
    const plan = this.plan();
    if (plan?.form !== 'polygon' || !plan.closed || this.form().message(this.at('sides_mm'))) return '';
    const { gap_mm, isOpen } = planClosure(plan);
    const isKnown = !this.form().message(this.at('turns_degrees')) && Number.isFinite(gap_mm);
    return isKnown && isOpen ? this.words.say('shape-plan-gap', { gap_mm }) : '';
  });
  protected readonly forms = [
    { value: 'straight', label: $localize`straight lengths, with returns` },
    { value: 'polygon', label: $localize`sides meeting in mitres` },
    { value: 'arc', label: $localize`a sweep` },
    { value: 'ellipse', label: $localize`an oval` },
  ];
  protected readonly edges = [
    { value: 'back', label: $localize`its least projection` },
    { value: 'front', label: $localize`its greatest projection` },
  ];
  protected readonly facings = [
    { value: 'outward', label: $localize`round the outside` },
    { value: 'inward', label: $localize`round the inside` },
  ];
  protected readonly lengthHeading = [$localize`Length`];
  protected readonly turnHeading = [$localize`Turn`];
  protected readonly lengthCells = () => [sideLength];
  protected readonly turnCells = () => [turn];

  protected at(name: string): string {
    return `${this.path()}.plan.${name}`;
  }

  protected change(form: string): void {
    const before = this.plan();
    if (!before) return;
    this.left.set(this.keyOf(before.form), before);
    const known = this.left.get(this.keyOf(form as PlanForm));
    this.form().put(`${this.path()}.plan`, known ?? changedPlan(before, form as PlanForm, this.formats.lengthUnit()));
  }

  /** One and the same moulding: what it is called and its profile. */
  private keyOf(form: PlanForm): string {
    const profile = this.form().value<unknown>(`${this.path()}.profile`);
    return JSON.stringify([this.form().value<unknown>('name'), profile, form]);
  }

  protected addSide(index: number): void {
    this.form().insert(
      this.at('sides_mm'),
      index,
      this.form().value<number>(this.at(`sides_mm.${index - 1}`)) ?? this.offered(500),
    );
    if (this.plan()?.form === 'polygon') this.form().insert(this.at('turns_degrees'), this.turns(), 90);
  }

  protected addReturn(index: number): void {
    this.form().insert(this.at('returns_mm'), index, this.offered(100));
  }

  protected addTurn(index: number): void {
    this.form().insert(this.at('turns_degrees'), index, 90);
  }

  private offered(length_mm: number): number {
    return offeredIn(this.formats.lengthUnit(), { length_mm }).length_mm;
  }

  private turns(): number {
    return (this.plan() as PolygonPlan).turns_degrees.length;
  }
}
