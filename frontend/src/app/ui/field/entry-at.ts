import { ChangeDetectionStrategy, Component, booleanAttribute, input } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import type { AnyDocumentForm } from '../../core/forms/document-form';

import { AreaField } from './area-field';
import { Entry } from './entry';
import { Field } from './field';
import { LengthField } from './length-field';
import { NumberField } from './number-field';
import { PercentField } from './percent-field';

/** How an entry is made; a `displacement` is a length that may be negative. */
export type EntryWay =
  'length' | 'displacement' | 'area' | 'number' | 'percent' | 'line' | 'paragraphs' | 'choice' | 'tick';

export interface EntryChoice {
  readonly value: string | number | null;
  readonly label: string;
}

/** One entry of a document form by its path, with its label and whatever is wrong with it. */
@Component({
  selector: 'app-entry-at',
  imports: [AreaField, Entry, Field, LengthField, NumberField, PercentField, ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './entry-at.html',
})
export class EntryAt {
  readonly form = input.required<AnyDocumentForm>();
  readonly path = input.required<string>();
  readonly way = input.required<EntryWay>();
  readonly label = input.required<string>();
  readonly hint = input('');
  readonly unit = input('');
  readonly choices = input<readonly EntryChoice[]>([]);
  readonly optional = input(false, { transform: booleanAttribute });
  readonly labelHidden = input(false, { transform: booleanAttribute });
  readonly dense = input(false, { transform: booleanAttribute });
}
