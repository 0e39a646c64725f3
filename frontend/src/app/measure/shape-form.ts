import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { type Shape, type ShapeKind, shapeKinds } from '#shared/measure/shape';
import { shapeDefaults } from '#shared/measure/shape-defaults';
import { type BoxFace, boxFaces } from '#shared/measure/solid-shape';
import type { AnyDocumentForm } from '../core/forms/document-form';
import { Formats } from '../core/formats/formats';
import { EntryAt } from '../ui/field/entry-at';
import { BandEditor } from './band-editor';
import { changedShape } from './changed-shape';
import { FlutingEditor } from './fluting-editor';
import { PlanEditor } from './plan-editor';
import { ProfileEditor } from './profile-editor';
import { ShapeCards } from './shape-cards';
import { shapeEntries } from './shape-entries';
import { ShapeGlyph } from './shape-glyph';
import { shapeNames } from './shape-names';
import { StationsEditor } from './stations-editor';
import { TwistEditor } from './twist-editor';

const faceNames: Readonly<Record<BoxFace, string>> = {
  top: $localize`Top`,
  bottom: $localize`Bottom`,
  front: $localize`Front`,
  back: $localize`Back`,
  left: $localize`Left`,
  right: $localize`Right`,
};

/** Kinds whose surface has a girth that may be fluted. */
const fluted: readonly ShapeKind[] = [
  'rectangle',
  'moulding',
  'turned',
  'straight-leg',
  'cabriole',
  'stations',
  'twisted',
  'cone',
  'band',
];

/** The shape of a member with everything that is measured of it, or the face of an opening. */
@Component({
  selector: 'app-shape-form',
  imports: [
    BandEditor,
    EntryAt,
    FlutingEditor,
    MatButton,
    PlanEditor,
    ProfileEditor,
    ShapeCards,
    ShapeGlyph,
    StationsEditor,
    TwistEditor,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './shape-form.html',
  styleUrl: './shape-form.scss',
})
export class ShapeForm {
  private readonly formats = inject(Formats);

  readonly form = input.required<AnyDocumentForm>();
  /** Where the shape stands in the document. */
  readonly path = input.required<string>();
  readonly kinds = input<readonly ShapeKind[]>(shapeKinds);
  readonly isDisabled = input(false);

  protected readonly names = shapeNames;
  protected readonly faces = boxFaces.map((face) => ({ face, label: faceNames[face] }));
  protected readonly isChoosing = signal(false);
  protected readonly shape = computed(() => this.form().value<Shape>(this.path()));
  protected readonly kind = computed(() => this.shape()?.kind ?? 'rectangle');
  protected readonly drawn = computed(() => shapeDefaults(this.kind()));
  protected readonly entries = computed(() => shapeEntries[this.kind()]);
  protected readonly hasEnds = computed(() => 'ends' in (this.shape() ?? {}));
  protected readonly takesFluting = computed(() => fluted.includes(this.kind()));

  protected at(name: string): string {
    return `${this.path()}.${name}`;
  }

  protected take(kind: ShapeKind): void {
    this.isChoosing.set(false);
    const before = this.shape();
    if (before && before.kind !== kind)
      this.form().put(this.path(), changedShape(before, kind, this.formats.lengthUnit()));
  }
}
