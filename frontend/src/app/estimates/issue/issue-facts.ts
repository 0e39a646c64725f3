import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import type { PricedIssueSummary } from '#shared/estimates/issue-schema';
import { Formats } from '../../core/formats/formats';
import { issueStateNames } from './issue-state-names';

/** When an issue was made and by whom, where it stands, until when its prices hold, and what was noted. */
@Component({
  selector: 'app-issue-facts',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <p class="row">
      <span class="chip" [class]="issue().state">{{ state() }}</span>
      <span i18n>made on {{ made() }} by {{ issue().issuedBy }}</span>
    </p>
    <p class="muted" i18n>Prices hold until {{ until() }}, those of leaf until {{ leafUntil() }}.</p>
    @if (issue().note; as note) {
      <p class="text">{{ note }}</p>
    }
    @if (issue().markNote; as note) {
      <p class="text"><span class="muted" i18n>Noted with its state:</span> {{ note }}</p>
    }
    <p class="muted small seal" i18n>Frozen with SHA-256 {{ issue().sha256 }}</p>
  `,
  styles: `
    :host {
      display: grid;
      gap: 6px;
    }

    .text {
      white-space: pre-line;
    }

    .seal {
      max-width: none;
      overflow-wrap: anywhere;
    }

    .accepted {
      border-color: var(--verdigris);
      color: var(--verdigris);
    }

    .declined {
      border-color: var(--wrong);
      color: var(--wrong);
    }
  `,
})
export class IssueFacts {
  private readonly formats = inject(Formats);

  readonly issue = input.required<PricedIssueSummary>();

  protected readonly state = computed(() => {
    const { state, markedOn } = this.issue();
    const name = issueStateNames[state];
    return markedOn ? $localize`${name}:state: on ${this.formats.day(markedOn)}:day:` : name;
  });
  protected readonly made = computed(() => {
    const { issuedAt } = this.issue();
    return `${this.formats.dayOf(issuedAt)}, ${this.formats.time(issuedAt)}`;
  });
  protected readonly until = computed(() => this.formats.day(this.issue().validUntil));
  protected readonly leafUntil = computed(() => this.formats.day(this.issue().leafValidUntil));
}
