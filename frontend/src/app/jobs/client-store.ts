import { Injectable, computed, inject, resource, signal } from '@angular/core';
import type { Client } from '#shared/jobs/client-schema';
import { ClientCalls } from './client-calls';

/** The client whose page is open. */
@Injectable()
export class ClientStore {
  private readonly calls = inject(ClientCalls);
  private readonly clientId = signal<string | undefined>(undefined);
  private readonly kept = resource({
    params: () => this.clientId(),
    loader: ({ params, abortSignal }) => this.calls.read(params, abortSignal),
  });

  readonly client = computed(() => (this.kept.hasValue() ? this.kept.value() : undefined));
  readonly problem = computed(() => this.kept.error()?.message ?? '');

  open(clientId: string): void {
    this.clientId.set(clientId);
  }

  reload(): void {
    this.kept.reload();
  }

  /** The client as they were kept just now. */
  put(client: Client): void {
    this.kept.set(client);
  }

  remove(client: Client): Promise<void> {
    return this.calls.remove(client);
  }
}
