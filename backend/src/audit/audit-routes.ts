import { audienceOf } from '#shared/actor/role';
import { listHistory } from '#shared/audit/history-endpoints';
import { mount, type Route } from '../platform/http/mount';
import { presentAuditEntry, presentAuditLine } from './audit-presenter';
import type { AuditService } from './audit-service';

export const auditRoutes = (audit: AuditService): Route[] => [
  mount(listHistory, async ({ actor, query }) => {
    const page = await audit.page(actor.workshopId, query);
    const present = audienceOf(actor.roles) === 'cost' ? presentAuditEntry : presentAuditLine;
    return { ...page, items: page.items.map(present) };
  }),
];
