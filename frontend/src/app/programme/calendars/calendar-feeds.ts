import { Clipboard } from '@angular/cdk/clipboard';
import { ChangeDetectionStrategy, Component, computed, effect, inject, resource, signal } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { feedEntrySchema, type Feed } from '#shared/programme/calendar-feed-schema';
import { Formats } from '../../core/formats/formats';
import { schemaForm } from '../../core/forms/schema-form';
import { newId } from '../../core/new-id';
import { Notices } from '../../core/problems/notices';
import { ProblemError } from '../../core/problems/problem-error';
import { Session } from '../../core/session/session';
import { Confirm } from '../../ui/dialog/confirm';
import { Entry } from '../../ui/field/entry';
import { Field } from '../../ui/field/field';
import { FormComplaint } from '../../ui/field/form-complaint';
import { Icon } from '../../ui/icon/icon';
import { FeedClient } from './feed-client';

/** Calendars that other programs read: made, their address copied once, taken back. */
@Component({
  selector: 'app-calendar-feeds',
  imports: [Entry, Field, FormComplaint, Icon, MatButton, ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './calendar-feeds.html',
  styleUrl: './calendar-feeds.scss',
})
export class CalendarFeeds {
  private readonly client = inject(FeedClient);
  private readonly clipboard = inject(Clipboard);
  private readonly confirm = inject(Confirm);
  private readonly formats = inject(Formats);
  private readonly notices = inject(Notices);
  private readonly session = inject(Session);

  protected readonly isOfOffice = this.session.may('owner', 'estimator', 'office');
  protected readonly feeds = resource({ loader: ({ abortSignal }) => this.client.list(abortSignal) });
  private readonly people = resource({ loader: ({ abortSignal }) => this.client.people(abortSignal) });
  protected readonly everybody = computed(() => (this.people.hasValue() ? this.people.value() : []));
  protected readonly live = computed(() =>
    (this.feeds.hasValue() ? this.feeds.value() : [])
      .filter(({ revokedAt }) => revokedAt === null)
      .map((feed) => ({ ...feed, told: this.told(feed) })),
  );
  protected readonly made = signal<{ readonly name: string; readonly address: string } | undefined>(undefined);
  protected readonly form = schemaForm(feedEntrySchema, { name: '', personId: null });

  constructor() {
    effect(() => {
      const first = this.everybody().at(0);
      if (!this.isOfOffice && first) this.form.reset({ name: first.name, personId: first.id });
    });
  }

  protected async make(): Promise<void> {
    await this.form.send(async (entry) => {
      const { name, address } = await this.client.make(newId(), entry);
      this.made.set({ name, address: new URL(address, location.origin).href });
      this.form.reset({ name: '', personId: entry.personId });
      this.feeds.reload();
    });
  }

  protected copy(address: string): void {
    if (this.clipboard.copy(address)) this.notices.say($localize`The address is copied.`);
    else this.notices.complain($localize`It could not be copied. Mark it and copy it by hand.`);
  }

  protected async revoke({ id, name }: Feed): Promise<void> {
    const isSure = await this.confirm.ask({
      heading: $localize`Take “${name}:name:” back?`,
      text: $localize`Its address leads nowhere from then on, and calendar programs that read it show it no more.`,
      yes: $localize`Take it back`,
    });
    if (!isSure) return;
    try {
      await this.client.revoke(id);
      this.feeds.reload();
    } catch (error) {
      if (!(error instanceof ProblemError)) throw error;
      this.notices.complain(error.message);
    }
  }

  private told({ personId, madeBy, madeAt, readAt }: Feed): string {
    const person = this.everybody().find(({ id }) => id === personId)?.name;
    const of = personId === null ? $localize`the whole workshop` : (person ?? $localize`one person`);
    const made = $localize`made by ${madeBy}:name: on ${this.formats.dayOf(madeAt)}:day:`;
    const read = readAt ? $localize`read on ${this.formats.dayOf(readAt)}:day:` : $localize`not read yet`;
    return [of, made, read].join(' · ');
  }
}
