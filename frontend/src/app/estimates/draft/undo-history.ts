import { computed, signal } from '@angular/core';
import { canonicalJson } from '#shared/estimates/canonical-json';
import type { Edit } from './edit';

/** The rate card before, and the one that was taken instead. */
export interface CardStep {
  readonly before: string;
  readonly after: string;
}

/** One thing done: what was there before, and what came of it. */
interface Step {
  readonly before: readonly Edit[];
  readonly after: readonly Edit[];
  readonly at: number;
  /** Steps of one key that follow each other closely are one: the letters of a word. */
  readonly key: string;
  /** Where it was another rate card. */
  readonly card?: CardStep;
}

/** A step to be made, or the name of what somebody else changed since. */
export type Undone = { readonly edits: readonly Edit[]; readonly rateCardId?: string } | { readonly changed: string };

/** What an item is at present, and which card the estimate is worked on. */
export interface Present {
  readonly content: (edit: Edit) => Edit['content'];
  readonly rateCardId: string | undefined;
}

const together_ms = 2000;
const remembered = 200;

const nameIn = (edit: Edit): string => {
  if (!edit.content) return '';
  return 'name' in edit.content ? edit.content.name : edit.content.title;
};

const isAs = (edit: Edit, present: Present): boolean =>
  canonicalJson(present.content(edit)) === canonicalJson(edit.content);

/** What was done on this page and can be taken back: inverse changes, refused where somebody else was there since. */
export class UndoHistory {
  private readonly past = signal<readonly Step[]>([]);
  private readonly future = signal<readonly Step[]>([]);

  readonly canUndo = computed(() => this.past().length > 0);
  readonly canRedo = computed(() => this.future().length > 0);

  record(step: Step): void {
    this.future.set([]);
    this.past.update((past) => {
      const last = past.at(-1);
      const isOne = last !== undefined && step.key !== '' && last.key === step.key && step.at - last.at < together_ms;
      return isOne ? [...past.slice(0, -1), { ...step, before: last.before }] : [...past.slice(-remembered), step];
    });
  }

  undo(present: Present): Undone | undefined {
    const step = this.past().at(-1);
    if (!step) return undefined;
    this.past.update((past) => past.slice(0, -1));
    return (
      this.turned(step, present) ?? this.moved(this.future, step, { edits: step.before, rateCardId: step.card?.before })
    );
  }

  redo(present: Present): Undone | undefined {
    const step = this.future().at(-1);
    if (!step) return undefined;
    this.future.update((future) => future.slice(0, -1));
    const card = step.card && { before: step.card.after, after: step.card.before };
    const back = { ...step, before: step.after, after: step.before, card };
    return (
      this.turned(back, present) ?? this.moved(this.past, step, { edits: step.after, rateCardId: step.card?.after })
    );
  }

  /** The refusal where something is no longer as the step left it. */
  private turned(step: Step, present: Present): Undone | undefined {
    if (step.card && step.card.after !== present.rateCardId) return { changed: $localize`The rate card` };
    const changed = step.after.find((edit) => !isAs(edit, present));
    if (!changed) return undefined;
    const before = step.before.find((edit) => edit.id === changed.id);
    return { changed: nameIn(changed) || (before ? nameIn(before) : '') };
  }

  private moved(to: typeof this.past, step: Step, undone: Undone): Undone {
    to.update((steps) => [...steps, { ...step, key: '' }]);
    return undone;
  }
}
