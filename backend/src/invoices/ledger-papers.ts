import { fileName } from '../documents';
import type { NewFile } from '../platform/files/file-store';
import { FileAnswer } from '../platform/http/answer';
import { todayIn, wordsOf, workshopOnPaper, type InvoiceParts } from './invoice-parts';
import { journalCsv, journalWorkbook } from './journal-workbook';
import type { Days, LedgerService } from './ledger-service';

const workbookMedia = 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet';

/** Statements and journals as files. */
export class LedgerPapers {
  constructor(
    private readonly parts: InvoiceParts,
    private readonly ledger: LedgerService,
  ) {}

  async statement(workshopId: string, clientId: string, days: Days): Promise<NewFile> {
    const statement = await this.ledger.statement(workshopId, clientId, days);
    const client = await this.parts.jobs.client(workshopId, clientId);
    const { logoFileId } = await this.parts.workshops.get(workshopId);
    const bytes = await this.parts.papers.statement({
      workshop: await workshopOnPaper(this.parts, workshopId),
      logo: logoFileId ? (await this.parts.workshops.logo(workshopId)).bytes : null,
      address: [client.contact, client.address],
      statement,
      madeAt: this.parts.clock.now().toISOString(),
      madeOn: await todayIn(this.parts, workshopId),
    });
    return { bytes, name: fileName([client.name, days.from, days.to], 'pdf'), media: 'application/pdf' };
  }

  async journal(workshopId: string, form: 'journal.csv' | 'journal.xlsx', days: Days): Promise<FileAnswer> {
    const journal = await this.ledger.journal(workshopId, days);
    const words = await wordsOf(this.parts, workshopId);
    const name = (ending: string) => fileName([words.say('journal-sheet'), days.from, days.to], ending);
    if (form === 'journal.csv')
      return new FileAnswer(Buffer.from(journalCsv({ journal, words })), { name: name('csv'), media: 'text/csv' });
    const workshop = await this.parts.workshops.get(workshopId);
    const marks = {
      author: workshop.name,
      madeAt: this.parts.clock.now(),
      paper: workshop.paperSize === 'Letter' ? 'Letter' : 'A4',
    } as const;
    return new FileAnswer(await journalWorkbook({ journal, words }, marks), {
      name: name('xlsx'),
      media: workbookMedia,
    });
  }
}
