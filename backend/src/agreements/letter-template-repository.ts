import type { LetterKind } from '#shared/agreements/letter-kinds';
import type { Database } from '../platform/database/database';
import { WorkshopRows } from '../platform/database/workshop-rows';
import { letterTemplateTable, type LetterTemplateRow } from './letter-template-model';

/** The words of letters, where workshops have their own. */
export class LetterTemplateRepository extends WorkshopRows<LetterTemplateRow> {
  constructor(database: Database) {
    super(letterTemplateTable(database));
  }

  async ofKind(workshopId: string, kind: LetterKind): Promise<LetterTemplateRow | undefined> {
    const [row] = await this.list(workshopId, { where: { kind }, limit: 1 });
    return row;
  }
}
