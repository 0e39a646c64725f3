import type { Access } from '#shared/agreements/access-schema';
import type { Formats } from '../core/formats/formats';

/** How a way in stands, in one line: taken back, ended, opened, or not opened yet. */
export function accessState({ revokedAt, endsAt, openedAt }: Access, formats: Formats, now: Date): string {
  if (revokedAt) return $localize`taken back on ${formats.dayOf(revokedAt)}:day:`;
  if (new Date(endsAt) <= now) return $localize`ended on ${formats.dayOf(endsAt)}:day:`;
  const until = formats.dayOf(endsAt, 'short');
  if (!openedAt) return $localize`not opened yet, works until ${until}:day:`;
  return $localize`opened on ${formats.dayOf(openedAt, 'short')}:opened:, works until ${until}:day:`;
}

/** Whether it still opens something. */
export const isOpenAccess = ({ revokedAt, endsAt }: Access, now: Date): boolean =>
  revokedAt === null && new Date(endsAt) > now;
