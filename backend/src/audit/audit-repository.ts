import type { Database } from '../platform/database/database';
import { WorkshopRows, type Page, type PageAsked } from '../platform/database/workshop-rows';
import { auditTable, type AuditRow } from './audit-model';

/** The history of each workshop. Entries are added; only the newest of a thing is ever written on. */
export class AuditRepository extends WorkshopRows<AuditRow> {
  constructor(database: Database) {
    super(auditTable(database));
  }

  async newestAbout(workshopId: string, subjectId: string): Promise<AuditRow | undefined> {
    const [row] = await this.list(workshopId, { where: { subjectId }, order: [['id', 'DESC']], limit: 1 });
    return row;
  }

  pageOf(workshopId: string, asked: PageAsked & { jobId?: string | undefined }): Promise<Page<AuditRow>> {
    return this.page(workshopId, asked, asked.jobId === undefined ? {} : { jobId: asked.jobId });
  }
}
