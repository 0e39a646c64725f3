import { Injectable, computed, inject, resource } from '@angular/core';
import { changeWorkshop, putLogo, readLogo, readWorkshop, removeLogo } from '#shared/accounts/workshop-endpoints';
import type { Workshop, WorkshopSettings } from '#shared/accounts/workshop-schema';
import { addressOf } from '../core/api/address-of';
import { Api } from '../core/api/api';
import { AccountsSession } from './accounts-session';

/** The settings of the workshop and the picture of its letterhead. */
@Injectable()
export class WorkshopStore {
  private readonly api = inject(Api);
  private readonly accounts = inject(AccountsSession);
  private readonly read = resource({
    loader: ({ abortSignal }) => this.api.call(readWorkshop, { signal: abortSignal }),
  });

  readonly workshop = computed(() => (this.read.hasValue() ? this.read.value() : undefined));
  readonly problem = computed(() => this.read.error()?.message ?? '');
  /** Another address for every picture, so that the browser never shows the one before. */
  readonly logoAddress = computed(() => {
    const fileId = this.workshop()?.logoFileId;
    return fileId ? addressOf(readLogo, { query: { file: fileId } }) : undefined;
  });

  /** Keeps the settings; the page writes figures by them from then on. */
  async keep(body: WorkshopSettings): Promise<Workshop> {
    const workshop = await this.api.call(changeWorkshop, { body, version: this.version() });
    this.read.set(workshop);
    await this.accounts.read();
    return workshop;
  }

  async putLogo(file: File): Promise<void> {
    this.read.set(await this.api.call(putLogo, { file, version: this.version() }));
  }

  async removeLogo(): Promise<void> {
    this.read.set(await this.api.call(removeLogo, { version: this.version() }));
  }

  reload(): void {
    this.read.reload();
  }

  private version(): number {
    return this.workshop()?.version ?? 0;
  }
}
