import type { Figures } from '#shared/estimates/figures';
import { Rejection } from '#shared/problems/rejection';
import { Remembered } from '#shared/units/remembered';
import type { ClientIssueRows } from '../agreements';
import type { Estimates } from '../estimates';
import { presentClientFrozen, type ClientFrozen } from './client-frozen-presenter';

/**
 * What an issue froze, as its client reads it. Working its alternatives takes as long as working the estimate so many times, and gives the
 * same to every reader: it is done once, and kept by the fingerprint of what was frozen.
 */
export class FrozenIssuePages {
  private readonly pages = new Remembered<Promise<ClientFrozen>>(200);

  constructor(private readonly frozen: Pick<Estimates['frozen'], 'chosen'>) {}

  /** The page of an issue its reader may see: whether they may is asked before. */
  of(issue: ClientIssueRows): Promise<ClientFrozen> {
    const key = `${issue.row.workshopId} ${issue.row.id} ${issue.row.sha256}`;
    const page = this.pages.of(key, () => this.made(issue));
    page.catch(() => this.pages.forget(key));
    return page;
  }

  private async made(issue: ClientIssueRows): Promise<ClientFrozen> {
    return presentClientFrozen(issue.snapshot, await this.alternatives(issue));
  }

  /** Each alternative worked by itself from what was frozen; one that cannot be taken alone is shown without its strips. */
  private async alternatives(issue: ClientIssueRows): Promise<Map<string, Figures>> {
    const worked = new Map<string, Figures>();
    for (const { id } of issue.snapshot.draft.settings.alternatives) {
      const chosen = await this.frozen.chosen(issue, [id]).catch((error: unknown) => {
        if (error instanceof Rejection && error.kind === 'conflict') return undefined;
        throw error;
      });
      if (chosen) worked.set(id, chosen.figures);
    }
    return worked;
  }
}
