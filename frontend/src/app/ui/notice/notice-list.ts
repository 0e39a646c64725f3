import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { MatButton, MatIconButton } from '@angular/material/button';
import { Notices, type Notice } from '../../core/problems/notices';
import { Icon } from '../icon/icon';

/** Shows what is said in passing, above the thumb; the shell holds the only one. */
@Component({
  selector: 'app-notice-list',
  imports: [Icon, MatButton, MatIconButton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { 'aria-live': 'polite', role: 'status', class: 'no-print' },
  template: `
    @for (notice of notices.current(); track notice.id) {
      <div class="notice" [class.wrong]="notice.isWrong">
        <p>{{ notice.text }}</p>
        @if (notice.action; as action) {
          <button matButton type="button" (click)="run(notice)">{{ action.label }}</button>
        }
        <button matIconButton type="button" i18n-aria-label aria-label="Close" (click)="notices.close(notice.id)">
          <app-icon name="close" />
        </button>
      </div>
    }
  `,
  styles: `
    :host {
      position: fixed;
      z-index: 20;
      right: 24px;
      bottom: 24px;
      display: grid;
      gap: 8px;
      width: min(440px, calc(100vw - 32px));
    }

    .notice {
      display: flex;
      gap: 8px;
      align-items: center;
      padding: 4px 4px 4px 16px;
      border: 1px solid var(--line);
      border-left: 3px solid var(--verdigris);
      border-radius: var(--radius-small);
      background: var(--paper);
      box-shadow: 0 4px 16px rgb(0 0 0 / 18%);
    }

    .wrong {
      border-left-color: var(--wrong);
    }

    p {
      flex: 1;
    }

    @media (max-width: 640px) {
      :host {
        right: 16px;
        bottom: 88px;
      }
    }
  `,
})
export class NoticeList {
  protected readonly notices = inject(Notices);

  protected run(notice: Notice): void {
    this.notices.close(notice.id);
    notice.action?.run();
  }
}
