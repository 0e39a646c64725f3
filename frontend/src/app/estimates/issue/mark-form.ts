import { ChangeDetectionStrategy, Component, computed, effect, inject, input, output, untracked } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { issueMarkSchema, type PricedIssueSummary } from '#shared/estimates/issue-schema';
import { schemaForm } from '../../core/forms/schema-form';
import { Notices } from '../../core/problems/notices';
import { Confirm } from '../../ui/dialog/confirm';
import { Entry } from '../../ui/field/entry';
import { Field } from '../../ui/field/field';
import { FormComplaint } from '../../ui/field/form-complaint';
import { IssueClient, type IssueMark } from './issue-client';
import { issueStateNames } from './issue-state-names';
import { Validity } from './validity';

const choices: Readonly<Record<'issued' | 'sent', readonly IssueMark['state'][]>> = {
  issued: ['sent', 'accepted', 'declined'],
  sent: ['accepted', 'declined'],
};

/** Says that an issue was sent, accepted or declined, when, and what was said; the last two stand for good. */
@Component({
  selector: 'app-mark-form',
  imports: [Entry, Field, FormComplaint, MatButton, ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <form class="fields single" [formGroup]="form.group" (ngSubmit)="send()">
      <app-field i18n-label label="It was" [complaint]="form.message('state')">
        <select appEntry formControlName="state">
          @for (state of states(); track state) {
            <option [value]="state">{{ names[state] }}</option>
          }
        </select>
      </app-field>
      <app-field i18n-label label="On" [complaint]="form.message('day')">
        <input appEntry type="date" [max]="validity.today()" formControlName="day" />
      </app-field>
      <app-field i18n-label label="Note" [optional]="true" [complaint]="form.message('note')">
        <textarea appEntry rows="2" maxlength="1000" formControlName="note"></textarea>
      </app-field>
      <app-form-complaint [texts]="form.general()" />
      <div class="actions">
        <button matButton="outlined" type="submit" [disabled]="form.isSending()" i18n>Mark it</button>
      </div>
    </form>
  `,
})
export class MarkForm {
  private readonly client = inject(IssueClient);
  private readonly confirm = inject(Confirm);
  private readonly notices = inject(Notices);
  protected readonly validity = inject(Validity);

  readonly issue = input.required<PricedIssueSummary>();
  readonly marked = output<PricedIssueSummary>();

  protected readonly form = schemaForm(issueMarkSchema, { state: null, day: '', note: '' });
  protected readonly names = issueStateNames;
  protected readonly states = computed(() => choices[this.issue().state === 'sent' ? 'sent' : 'issued']);

  constructor() {
    // Once marked as sent, it is asked what came of it.
    effect(() => {
      const [state, day] = [this.states()[0], this.validity.today()];
      untracked(() => this.form.reset({ state, day, note: '' }));
    });
  }

  protected async send(): Promise<void> {
    const { id, letter } = this.issue();
    const state = this.form.parsed()?.state;
    if (state && state !== 'sent' && !(await this.isMeant(letter, state))) return;
    await this.form.send(async (mark) => {
      this.marked.emit(await this.client.mark(id, mark));
      this.notices.say($localize`Issue ${letter}:letter: is marked as ${issueStateNames[mark.state]}:state:.`);
    });
  }

  private isMeant(letter: string, state: IssueMark['state']): Promise<boolean> {
    const name = issueStateNames[state];
    return this.confirm.ask({
      heading: $localize`Mark issue ${letter}:letter: as ${name}:state:?`,
      text: $localize`It stands for good; a later change is a new issue or a variation.`,
      yes: $localize`Mark it as ${name}:state:`,
    });
  }
}
