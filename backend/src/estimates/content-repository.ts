import type { Database } from '../platform/database/database';
import { WorkshopRows, type VersionedRow } from '../platform/database/workshop-rows';
import { memberContentTable, pieceContentTable, type MemberContentRow, type PieceContentRow } from './content-model';

/** The pieces and the members of estimates. */
export class ContentRepository<R extends VersionedRow & { readonly estimateId: string }> extends WorkshopRows<R> {
  ofEstimate(workshopId: string, estimateId: string): Promise<R[]> {
    return this.list(workshopId, { where: { estimateId } as never });
  }

  async removeOf(workshopId: string, estimateId: string): Promise<void> {
    await this.table.destroy({ where: { workshopId, estimateId } as never });
  }
}

export const pieceRepository = (database: Database) =>
  new ContentRepository<PieceContentRow>(pieceContentTable(database));
export const memberRepository = (database: Database) =>
  new ContentRepository<MemberContentRow>(memberContentTable(database));
