import { ChangeDetectionStrategy, Component, computed, inject, resource } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { endOtherSessions, endOwnSession, listOwnSessions } from '#shared/accounts/session-endpoints';
import type { OwnSession } from '#shared/accounts/session-schema';
import { Api } from '../core/api/api';
import { Formats } from '../core/formats/formats';
import { deviceName } from './device-name';

/** Where else the same person is signed in, to end what should not be. */
@Component({
  selector: 'app-own-sessions',
  imports: [MatButton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <ul class="plain">
      @for (session of sessions(); track session.id) {
        <li>
          <span>
            {{ deviceName(session.agent) }}
            @if (session.isThisOne) {
              <span class="chip" i18n>this one</span>
            }
            <span class="muted small" i18n
              >last used {{ formats.dayOf(session.seenAt, 'short') }}, {{ formats.time(session.seenAt) }}</span
            >
          </span>
          @if (!session.isThisOne) {
            <button matButton type="button" (click)="end(session)" i18n>End it</button>
          }
        </li>
      }
    </ul>
    @if (sessions().length > 1) {
      <button matButton="outlined" type="button" (click)="endOthers()" i18n>End all others</button>
    }
  `,
  styles: `
    :host {
      display: grid;
      gap: 16px;
      justify-items: start;
    }

    ul {
      width: 100%;
    }

    li {
      display: flex;
      gap: 16px;
      align-items: center;
      justify-content: space-between;
      min-height: 56px;
      border-bottom: 1px solid var(--line);
    }

    .small {
      display: block;
    }
  `,
})
export class OwnSessions {
  private readonly api = inject(Api);
  private readonly read = resource({
    loader: ({ abortSignal }) => this.api.call(listOwnSessions, { signal: abortSignal }),
  });
  protected readonly formats = inject(Formats);
  protected readonly deviceName = deviceName;

  protected readonly sessions = computed(() => (this.read.hasValue() ? this.read.value().items : []));

  protected async end({ id }: OwnSession): Promise<void> {
    await this.api.call(endOwnSession, { params: { id } });
    this.read.reload();
  }

  protected async endOthers(): Promise<void> {
    await this.api.call(endOtherSessions, {});
    this.read.reload();
  }
}
