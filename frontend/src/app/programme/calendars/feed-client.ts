import { Injectable, inject } from '@angular/core';
import type { BodyOf } from '#shared/actor/endpoint';
import { listFeeds, makeFeed, readBenchDay, revokeFeed } from '#shared/programme/board-endpoints';
import { Api } from '../../core/api/api';

/** The calls about calendars for other programs. */
@Injectable({ providedIn: 'root' })
export class FeedClient {
  private readonly api = inject(Api);

  async list(signal: AbortSignal) {
    return (await this.api.call(listFeeds, { signal })).items;
  }

  /** Who there is a calendar of; who only works at the bench is told of themselves. */
  async people(signal: AbortSignal) {
    const { people, person } = await this.api.call(readBenchDay, { query: {}, signal });
    return people.length > 0 ? people : person ? [person] : [];
  }

  make(feedId: string, body: BodyOf<typeof makeFeed>) {
    return this.api.call(makeFeed, { params: { feedId }, body });
  }

  revoke(feedId: string) {
    return this.api.call(revokeFeed, { params: { feedId } });
  }
}
