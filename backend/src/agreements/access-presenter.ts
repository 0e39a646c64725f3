import type { Access } from '#shared/agreements/access-schema';
import type { ClientAccessRow } from './client-access-model';

/** Never the hash of its secret. */
export const presentAccess = (row: ClientAccessRow): Access => ({
  id: row.id,
  purpose: row.purpose,
  createdAt: row.createdAt.toISOString(),
  createdBy: row.createdBy,
  endsAt: row.endsAt.toISOString(),
  revokedAt: row.revokedAt?.toISOString() ?? null,
  openedAt: row.openedAt?.toISOString() ?? null,
});
