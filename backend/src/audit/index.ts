import type { Platform } from '../platform/platform';
import type { Route } from '../platform/http/mount';
import { AuditRepository } from './audit-repository';
import { auditRoutes } from './audit-routes';
import { AuditService } from './audit-service';

export type { AuditService, Deed, Doer } from './audit-service';

export interface Audit {
  readonly service: AuditService;
  readonly routes: readonly Route[];
}

/** History: what was done, by whom, to what. */
export function openAudit({ database, clock }: Platform): Audit {
  const service = new AuditService(new AuditRepository(database), clock);
  return { service, routes: auditRoutes(service) };
}
