/** What decides in which lot a zone is coated: its piece, its build-up, and the lot its member names (empty: as proposed). */
export interface LotKey {
  readonly pieceId: string;
  readonly buildUpId: string;
  readonly lot: string;
}

/** The id of a lot: of the proposed one the piece's and the build-up's, of a named one its name besides. */
export const lotIdOf = ({ pieceId, buildUpId, lot }: LotKey): string =>
  [pieceId, buildUpId, ...(lot === '' ? [] : [lot])].join('/');
