import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { MatButton, MatIconButton } from '@angular/material/button';
import { MatMenu, MatMenuItem, MatMenuTrigger } from '@angular/material/menu';
import { Formats } from '../core/formats/formats';
import { MemberPicture, ShapeForm } from '../measure';
import { EntryAt } from '../ui/field/entry-at';
import { Icon } from '../ui/icon/icon';
import { EmptyState } from '../ui/page/empty-state';
import { FindingList } from '../ui/page/finding-list';
import { EstimateStore } from './estimate-store';
import { MemberParticulars } from './measuring/member-particulars';
import { OpeningList } from './measuring/opening-list';
import { SurfaceFigures } from './measuring/surface-figures';
import { ZoneList } from './measuring/zone-list';
import { MemberActions } from './members/member-actions';
import { memberForm } from './members/member-form';
import { MemberSelection } from './members/member-selection';
import { MemberPlace } from './places/member-place';

/** Measure: the shape of the selected member as it was taken, drawn to scale, and the surface it comes to. */
@Component({
  selector: 'app-measure-page',
  imports: [
    EmptyState,
    EntryAt,
    FindingList,
    Icon,
    MatButton,
    MatIconButton,
    MatMenu,
    MatMenuItem,
    MatMenuTrigger,
    MemberParticulars,
    MemberPicture,
    MemberPlace,
    OpeningList,
    ShapeForm,
    SurfaceFigures,
    ZoneList,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './measure-page.html',
  styleUrl: './measure-page.scss',
})
export class MeasurePage {
  private readonly formats = inject(Formats);
  protected readonly store = inject(EstimateStore);
  protected readonly selection = inject(MemberSelection);
  protected readonly actions = inject(MemberActions);
  protected readonly form = memberForm();

  /** Girth and run under the name, where the member has them. */
  protected readonly about = computed(() => {
    const figures = this.store.figures()?.members.find(({ memberId }) => memberId === this.selection.member()?.id);
    const girth = figures?.girth_mm ? $localize`girth ${this.formats.length(figures.girth_mm)}:girth:` : '';
    const run = figures?.run_mm ? $localize`run ${this.formats.length(figures.run_mm)}:run:` : '';
    return [figures?.timber, girth, run].filter(Boolean).join(', ');
  });
  /** The alternative a member belongs to, as long as it is not the one shown. */
  protected readonly alternative = computed(() => {
    const id = this.selection.member()?.alternativeId ?? '';
    if (this.store.choice().includes(id)) return undefined;
    return this.store.settings()?.alternatives.find((alternative) => alternative.id === id);
  });
  /** What there is to tell about this member, its zones and openings. */
  protected readonly findings = computed(() => {
    const member = this.selection.member();
    const ids = [member?.id, ...(member?.zones.map(({ id }) => id) ?? [])];
    return (this.store.figures()?.findings ?? []).filter(
      ({ about, code }) => ids.includes(about) && code.startsWith('measure-'),
    );
  });
}
