import { startInvoiceSettings, type InvoiceSettings } from '#shared/invoices/invoice-settings';
import type { Actor } from '#shared/actor/actor';
import type { WorkshopService } from '../accounts';
import type { AuditService } from '../audit';
import { refuseStale } from '../platform/database/keeping';
import type { Database } from '../platform/database/database';
import { WorkshopRows } from '../platform/database/workshop-rows';
import { invoiceSettingsTable, type InvoiceSettingsRow } from './invoice-model';

interface Parts {
  readonly database: Database;
  readonly workshops: WorkshopService;
  readonly audit: AuditService;
}

export type KeptSettings = InvoiceSettings & { readonly version: number };

/** How a workshop invoices. Its one row is also what those wait for who give numbers or claim of a contract. */
export class InvoiceSettingsService {
  private readonly rows: WorkshopRows<InvoiceSettingsRow>;

  constructor(private readonly parts: Parts) {
    this.rows = new WorkshopRows(invoiceSettingsTable(parts.database));
  }

  async read(workshopId: string): Promise<KeptSettings> {
    const row = await this.rows.find(workshopId, workshopId);
    const content = row?.content ?? startInvoiceSettings(await this.parts.workshops.get(workshopId));
    return { ...content, version: row?.content ? row.version : 0 };
  }

  async keep(actor: Actor, version: number, settings: InvoiceSettings): Promise<KeptSettings> {
    const { workshopId } = actor;
    await this.hold(workshopId);
    const before = await this.read(workshopId);
    refuseStale({ ...before, workshopId, id: workshopId }, version);
    await this.rows.write(workshopId, workshopId, { content: settings, version: version + 1 });
    const subject = { kind: 'invoice-settings', id: workshopId };
    await this.parts.audit.record(actor, { subject, code: 'history-invoice-settings', before, after: settings });
    return this.read(workshopId);
  }

  /** Lets one at a time through, until the transaction ends. */
  async hold(workshopId: string): Promise<void> {
    await this.parts.database.execute(
      `INSERT INTO invoice_settings (workshop_id, id, version, content) VALUES (:workshopId, :workshopId, 0, NULL)
       ON DUPLICATE KEY UPDATE id = id`,
      { workshopId },
    );
    await this.rows.lock(workshopId, workshopId);
  }
}
