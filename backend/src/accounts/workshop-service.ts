import { v7 as newId } from 'uuid';
import { startTaxCategory } from '#shared/accounts/start-tax-category';
import type { NewWorkshop, WorkshopSettings } from '#shared/accounts/workshop-schema';
import type { Actor } from '#shared/actor/actor';
import type { Role } from '#shared/actor/role';
import { Rejection } from '#shared/problems/rejection';
import type { AuditService, Doer } from '../audit';
import type { Clock } from '../platform/clock/clock';
import type { FileStore, StoredFile } from '../platform/files/file-store';
import { redrawn } from '../platform/files/picture';
import type { Upload } from '../platform/http/call';
import type { MembershipRepository } from './membership-repository';
import type { WorkshopSettingsRow } from './workshop-model';
import type { WorkshopRepository } from './workshop-repository';

interface Parts {
  readonly workshops: WorkshopRepository;
  readonly memberships: MembershipRepository;
  readonly files: FileStore;
  readonly audit: AuditService;
  readonly clock: Clock;
}

/** What a person is called when they begin to belong to a workshop. */
export interface Joining {
  readonly accountId: string;
  readonly name: string;
  readonly roles: readonly Role[];
}

const emptySettings = {
  addressLines: [],
  telephone: '',
  email: '',
  taxRegistration: '',
} as const;
const letterhead = { longest_pixels: 1_200, as: 'png' } as const;

/** Workshops: founding them, their settings and their letterhead. */
export class WorkshopService {
  private readonly whenFounded: ((by: Doer) => Promise<void>)[] = [];

  private readonly whenCurrencyChanged: ((by: Actor, currency: string) => Promise<void>)[] = [];

  constructor(private readonly parts: Parts) {}

  /** What a later feature does where the workshop takes another currency, in the same transaction: it refuses, or carries its own over. */
  followCurrency(work: (by: Actor, currency: string) => Promise<void>): void {
    this.whenCurrencyChanged.push(work);
  }

  /** What a later feature brings to a new workshop, in the transaction that founds it. */
  bringAlong(work: (by: Doer) => Promise<void>): void {
    this.whenFounded.push(work);
  }

  get(workshopId: string): Promise<WorkshopSettingsRow> {
    return this.parts.workshops.get(workshopId);
  }

  /** Founds a workshop with its first owner; answers the workshop's id. */
  async found(owner: { accountId: string; name: string }, workshop: NewWorkshop): Promise<string> {
    const workshopId = newId();
    const start = { ...emptySettings, addressLines: [...emptySettings.addressLines], logoFileId: null, version: 1 };
    const createdAt = this.parts.clock.now();
    const defaultTaxCategory = startTaxCategory(workshop.country);
    await this.parts.workshops.insert({ ...workshop, ...start, defaultTaxCategory, id: workshopId, createdAt });
    await this.join(workshopId, { ...owner, roles: ['owner'] });
    await this.record({ workshopId, ...owner }, 'history-workshop-founded', { after: workshop });
    for (const work of this.whenFounded) await work({ workshopId, ...owner });
    return workshopId;
  }

  async join(workshopId: string, { accountId, roles }: Joining): Promise<string> {
    const id = newId();
    const createdAt = this.parts.clock.now();
    await this.parts.memberships.insert(workshopId, { id, accountId, roles, disabledAt: null, version: 1, createdAt });
    return id;
  }

  async change(actor: Actor, version: number, settings: WorkshopSettings): Promise<WorkshopSettingsRow> {
    const before = await this.parts.workshops.get(actor.workshopId);
    const after = await this.parts.workshops.change(actor.workshopId, version, settings);
    await this.record(actor, 'history-workshop-changed', { before, after });
    if (before.currency !== after.currency)
      for (const work of this.whenCurrencyChanged) await work(actor, after.currency);
    return after;
  }

  async putLogo(actor: Actor, version: number, upload: Upload | undefined): Promise<WorkshopSettingsRow> {
    const file = await this.parts.files.save(actor.workshopId, await redrawn(upload, letterhead));
    const after = await this.parts.workshops.change(actor.workshopId, version, { logoFileId: file.id });
    await this.record(actor, 'history-logo-changed', { after: { sha256: file.sha256 } });
    return after;
  }

  async removeLogo(actor: Actor, version: number): Promise<WorkshopSettingsRow> {
    const after = await this.parts.workshops.change(actor.workshopId, version, { logoFileId: null });
    await this.record(actor, 'history-logo-removed', {});
    return after;
  }

  async logo(workshopId: string): Promise<StoredFile> {
    const { logoFileId } = await this.parts.workshops.get(workshopId);
    if (!logoFileId) throw new Rejection('not-found', 'problem-not-found');
    return this.parts.files.read(workshopId, logoFileId);
  }

  private record(
    by: { workshopId: string; accountId: string; name: string },
    code: 'history-workshop-founded' | 'history-workshop-changed' | 'history-logo-changed' | 'history-logo-removed',
    change: { before?: unknown; after?: unknown },
  ): Promise<void> {
    return this.parts.audit.record(by, { subject: { kind: 'workshop', id: by.workshopId }, code, ...change });
  }
}
