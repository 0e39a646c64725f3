import { ChangeDetectionStrategy, Component, inject, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { Notices } from '../core/problems/notices';
import { ProblemError } from '../core/problems/problem-error';
import { WorkshopStore } from './workshop-store';

/** The picture on the letterhead: shown, put there, taken off. */
@Component({
  selector: 'app-logo-entry',
  imports: [MatButton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (store.logoAddress(); as address) {
      <img [src]="address" i18n-alt alt="Picture on the letterhead" />
    } @else {
      <p class="muted" i18n>
        No picture yet. A PNG, JPEG or WebP with a clear ground does best; it stands at the head of every paper.
      </p>
    }
    <div class="actions">
      <button matButton="outlined" type="button" [disabled]="isSending()" (click)="file.click()" i18n>
        Choose a picture
      </button>
      @if (store.logoAddress()) {
        <button matButton type="button" (click)="remove()" i18n>Take it off</button>
      }
    </div>
    <input
      #file
      class="visually-hidden"
      type="file"
      tabindex="-1"
      accept="image/png,image/jpeg,image/webp"
      i18n-aria-label
      aria-label="Picture"
      (change)="put(file)"
    />
    @if (complaint()) {
      <p class="complaint" role="alert">{{ complaint() }}</p>
    }
  `,
  styles: `
    :host {
      display: grid;
      gap: 12px;
    }

    img {
      max-width: 280px;
      max-height: 120px;
      padding: 8px;
      border-radius: var(--radius-small);
      background: #fff;
    }

    .complaint {
      color: var(--wrong);
    }
  `,
})
export class LogoEntry {
  private readonly notices = inject(Notices);
  protected readonly store = inject(WorkshopStore);

  protected readonly isSending = signal(false);
  protected readonly complaint = signal('');

  protected async put(entry: HTMLInputElement): Promise<void> {
    const file = entry.files?.item(0);
    entry.value = '';
    if (file) await this.send(() => this.store.putLogo(file));
  }

  protected async remove(): Promise<void> {
    if (await this.send(() => this.store.removeLogo())) this.notices.say($localize`The picture is taken off.`);
  }

  private async send(work: () => Promise<void>): Promise<boolean> {
    this.isSending.set(true);
    this.complaint.set('');
    try {
      await work();
      return true;
    } catch (error) {
      if (!(error instanceof ProblemError)) throw error;
      this.complaint.set(error.problem.errors[0]?.message ?? error.message);
      return false;
    } finally {
      this.isSending.set(false);
    }
  }
}
