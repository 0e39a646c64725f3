import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { papers, type Paper } from '#shared/estimates/issue-schema';
import { Session } from '../../core/session/session';
import { Icon } from '../../ui/icon/icon';
import { IssueClient } from './issue-client';

const paperNames: Readonly<Record<Paper, string>> = {
  'estimate.pdf': $localize`Estimate, PDF`,
  'estimate.xlsx': $localize`Estimate, workbook`,
  'leaf-order.pdf': $localize`Leaf order, PDF`,
  'leaf-order.csv': $localize`Leaf order, CSV`,
};

/** The workbook shows how each line is worked. */
const withCost: Paper = 'estimate.xlsx';

/** The papers of an issue, byte for byte as they were made when it was issued. */
@Component({
  selector: 'app-issue-papers',
  imports: [Icon, MatButton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <ul class="plain">
      @for (paper of list(); track paper.key) {
        <li>
          <a matButton [href]="paper.address" download
            ><app-icon name="download" /> <span>{{ paper.name }}</span></a
          >
        </li>
      }
    </ul>
  `,
  styles: `
    :host {
      display: block;
    }

    li {
      margin-left: -12px;
    }
  `,
})
export class IssuePapers {
  private readonly client = inject(IssueClient);
  private readonly session = inject(Session);

  readonly issueId = input.required<string>();

  protected readonly list = computed(() =>
    papers
      .filter((key) => key !== withCost || this.session.may('owner', 'estimator'))
      .map((key) => ({ key, name: paperNames[key], address: this.client.paperAddress(this.issueId(), key) })),
  );
}
