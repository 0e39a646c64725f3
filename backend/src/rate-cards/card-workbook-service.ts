import type { Actor } from '#shared/actor/actor';
import { Rejection } from '#shared/problems/rejection';
import type { WorkshopService } from '../accounts';
import type { Seen } from '../platform/database/keeping';
import { FileAnswer } from '../platform/http/answer';
import type { Upload } from '../platform/http/call';
import { CardReading } from './card-reading';
import type { DraftCardService } from './draft-card-service';
import type { RateCardHead } from './rate-card-model';
import type { RateCardRepository } from './rate-card-repository';
import { writeCardWorkbook } from './workbook/write-card-workbook';

interface Parts {
  readonly cards: RateCardRepository;
  readonly drafts: DraftCardService;
  readonly workshops: Pick<WorkshopService, 'get'>;
}

const media = 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet';

/** Rate cards as workbooks: sent out whole, and taken in whole or not at all. */
export class CardWorkbookService {
  private readonly reading = new CardReading();

  constructor(private readonly parts: Parts) {}

  async export(workshopId: string, id: string): Promise<FileAnswer> {
    const { name, content } = await this.parts.cards.get(workshopId, id);
    const { currency } = await this.parts.workshops.get(workshopId);
    const bytes = await writeCardWorkbook({ name, content, currency });
    return new FileAnswer(bytes, { name: `${name}.xlsx`, media });
  }

  /** Fills a draft from a workbook; a draft that is not at the version seen is not even read for. */
  async import(actor: Actor, seen: Seen, upload: Upload | undefined): Promise<RateCardHead> {
    if (!upload || !/\.xlsx$/i.test(upload.name)) throw new Rejection('unsupported', 'workbook-not-xlsx');
    await this.parts.drafts.standing(actor, seen);
    const { currency } = await this.parts.workshops.get(actor.workshopId);
    return this.parts.drafts.fill(actor, seen, await this.reading.card(upload.bytes, currency));
  }
}
