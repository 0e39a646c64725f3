import { Rejection } from '#shared/problems/rejection';
import type { Clock } from '../platform/clock/clock';
import type { LinkPurpose } from './mailed-link-model';
import type { MailedLinkRepository } from './mailed-link-repository';
import { hashOfToken, newToken } from './new-token';

export interface NewLink {
  readonly purpose: LinkPurpose;
  readonly about: string;
  readonly content: object;
  readonly life_minutes: number;
}

const most = { links: 3, within_minutes: 15 } as const;
const later = (now: Date, minutes: number): Date => new Date(now.getTime() + minutes * 60_000);

/** Links that work once and not for long. */
export class MailedLinks {
  constructor(
    private readonly rows: MailedLinkRepository,
    private readonly clock: Clock,
  ) {}

  /** The secret of a new link; nothing if the same address was sent three within a quarter of an hour. */
  async make({ purpose, about, content, life_minutes }: NewLink): Promise<string | undefined> {
    const now = this.clock.now();
    if ((await this.rows.countSince(purpose, about, later(now, -most.within_minutes))) >= most.links) return undefined;
    const { token, tokenHash } = newToken();
    await this.rows.insert({
      tokenHash,
      purpose,
      about,
      content,
      createdAt: now,
      usedAt: null,
      endsAt: later(now, life_minutes),
    });
    return token;
  }

  /** Uses a link up; refused as gone if it was used, is too old, or never was. */
  async use<Content>(purpose: LinkPurpose, token: string): Promise<Content> {
    const link = await this.rows.use(purpose, hashOfToken(token), this.clock.now());
    if (!link) throw new Rejection('gone', 'problem-gone');
    return link.content as Content;
  }

  /** Ends those nobody has used yet. */
  end(purpose: LinkPurpose, about: string): Promise<void> {
    return this.rows.end(purpose, about, this.clock.now());
  }

  sweep(): Promise<number> {
    return this.rows.sweep(later(this.clock.now(), -7 * 24 * 60));
  }
}
