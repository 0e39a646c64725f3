import type { Accounts } from '../accounts';
import type { ClientRow, Jobs } from '../jobs';
import type { Clock } from '../platform/clock/clock';
import type { Tasks } from '../platform/tasks/tasks';
import type { AccessService } from './access-service';
import type { ClientAccessRepository } from './client-access-repository';
import type { LetterService } from './letter-service';

interface Parts {
  readonly accesses: ClientAccessRepository;
  readonly access: AccessService;
  readonly accounts: Pick<Accounts, 'workshops'>;
  readonly jobs: Pick<Jobs, 'clients'>;
  readonly letters: LetterService;
  readonly tasks: Tasks;
  readonly clock: Clock;
}

const requestKind = 'client-sign-in-request';
const life_minutes = 60;
const kept_days = 7;
const most = { letters: 3, within_minutes: 15 } as const;
const later = (now: Date, minutes: number): Date => new Date(now.getTime() + minutes * 60_000);

/** Whoever has jobs at a workshop: of several entries with one address the first, so that nobody is written to twice. */
function oneOfEach(clients: readonly ClientRow[]): ClientRow[] {
  const withJobs = clients.filter(({ jobs }) => jobs > 0);
  return [...new Map(withJobs.toReversed().map((client) => [client.workshopId, client])).values()];
}

/** Letters with a link to all of a client's papers, that opens them for an hour. */
export class SignInService {
  constructor(private readonly parts: Parts) {
    parts.tasks.register<{ email: string }>(requestKind, ({ email }) => this.write(email));
  }

  /** Does the same for every address: whether it is known is found out later, when nobody waits for the answer. */
  async ask(email: string): Promise<void> {
    await this.parts.tasks.add({ workshopId: null, kind: requestKind, content: { email } });
  }

  /** Forgets links that ended more than a week ago. */
  async sweep(): Promise<void> {
    await this.parts.accesses.sweepSignIns(later(this.parts.clock.now(), -kept_days * 24 * 60));
  }

  private async write(email: string): Promise<void> {
    for (const client of oneOfEach(await this.parts.jobs.clients.withEmail(email))) await this.writeTo(client);
  }

  private async writeTo(client: ClientRow): Promise<void> {
    const { workshopId, id, name } = client;
    const now = this.parts.clock.now();
    if ((await this.parts.accesses.signInsSince(workshopId, id, later(now, -most.within_minutes))) >= most.letters)
      return;
    const access = { jobId: null, createdBy: name, endsAt: later(now, life_minutes), purpose: 'sign-in' } as const;
    const { link } = await this.parts.access.add(client, access);
    await this.parts.letters.post(workshopId, { kind: 'sign-in', client, values: () => ({ link }) });
  }
}
