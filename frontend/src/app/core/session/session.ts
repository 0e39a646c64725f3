import { Injectable, computed, signal } from '@angular/core';
import { audienceOf, type Audience, type Role } from '#shared/actor/role';
import type { ReaderFacts, SessionFacts } from './session-facts';

/** Who is signed in, as signals; only `accounts` writes here. */
@Injectable({ providedIn: 'root' })
export class Session {
  private readonly state = signal<SessionFacts | undefined>(undefined);
  private readonly token = signal('');
  private readonly visited = signal<ReaderFacts | undefined>(undefined);

  readonly facts = this.state.asReadonly();
  readonly isSignedIn = computed(() => this.state() !== undefined);
  readonly workshop = computed(() => this.state()?.workshop);
  /** How figures are written: as the workshop a client visits has them, else as one's own. */
  readonly reader = computed<ReaderFacts | undefined>(() => this.visited() ?? this.workshop());
  readonly roles = computed<readonly Role[]>(() => this.state()?.membership?.roles ?? []);
  readonly audience = computed<Audience>(() => (this.roles().length > 0 ? audienceOf(this.roles()) : 'public'));
  /** Sent with every request that changes something, so that no other site can send one. */
  readonly requestToken = this.token.asReadonly();

  /** Whether the person holds one of these roles here. */
  may(...roles: readonly Role[]): boolean {
    return roles.some((role) => this.roles().includes(role));
  }

  /** Says whose papers a client reads, once they are there. */
  visit(reader: ReaderFacts | undefined): void {
    this.visited.set(reader);
  }

  put(facts: SessionFacts | undefined, requestToken: string): void {
    this.token.set(requestToken);
    this.state.set(facts);
  }
}
