import {
  ChangeDetectionStrategy,
  Component,
  ElementRef,
  Injector,
  afterNextRender,
  viewChild,
  computed,
  effect,
  inject,
  input,
  signal,
} from '@angular/core';
import { MatButton } from '@angular/material/button';
import { Router, RouterLink } from '@angular/router';
import type { Client } from '#shared/jobs/client-schema';
import { Notices } from '../core/problems/notices';
import { PageTitle } from '../core/routing/page-title';
import { Confirm } from '../ui/dialog/confirm';
import { EmptyState } from '../ui/page/empty-state';
import { LaterWidget } from '../ui/page/later-widget';
import { PageHeader } from '../ui/page/page-header';
import { Skeleton } from '../ui/page/skeleton';
import { ClientForm } from './client-form';
import { clientKindNames } from './client-kind-names';
import { ClientStore } from './client-store';

/** One client: how to reach them, their jobs, and changing or removing the entry. */
@Component({
  selector: 'app-client-page',
  imports: [ClientForm, EmptyState, LaterWidget, MatButton, PageHeader, RouterLink, Skeleton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  providers: [ClientStore],
  templateUrl: './client-page.html',
  styleUrl: './client-page.scss',
})
export class ClientPage {
  protected readonly store = inject(ClientStore);
  private readonly notices = inject(Notices);
  private readonly confirm = inject(Confirm);
  private readonly router = inject(Router);
  private readonly title = inject(PageTitle, { optional: true });

  readonly clientId = input.required<string>();

  private readonly injector = inject(Injector);
  private readonly changeButton = viewChild<unknown, ElementRef<HTMLElement>>('change', { read: ElementRef });
  protected readonly isChanging = signal(false);
  protected readonly kind = computed(() => clientKindNames[this.store.client()?.kind ?? 'person']);

  constructor() {
    effect(() => this.store.open(this.clientId()));
    effect(() => {
      const client = this.store.client();
      if (client) this.title?.name(client.name);
    });
  }

  protected keep(client: Client): void {
    this.store.put(client);
    this.close();
  }

  protected close(): void {
    this.isChanging.set(false);
    afterNextRender(() => this.changeButton()?.nativeElement.focus(), { injector: this.injector });
  }

  protected async remove(client: Client): Promise<void> {
    const isSure = await this.confirm.ask({
      heading: $localize`Remove the client?`,
      text: $localize`The entry of ${client.name}:name: goes for good.`,
      yes: $localize`Remove it`,
    });
    if (!isSure) return;
    await this.store.remove(client);
    this.notices.say($localize`${client.name}:name: is removed.`);
    await this.router.navigateByUrl('/clients');
  }
}
