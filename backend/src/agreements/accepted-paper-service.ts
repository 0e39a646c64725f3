import { Rejection } from '#shared/problems/rejection';
import type { FileStore } from '../platform/files/file-store';
import { FileAnswer } from '../platform/http/answer';
import type { DecisionRow } from './decision-model';
import type { DecisionRepository } from './decision-repository';

interface Parts {
  readonly decisions: DecisionRepository;
  readonly files: FileStore;
}

/** The papers clients accepted, byte for byte. */
export class AcceptedPaperService {
  constructor(private readonly parts: Parts) {}

  async read(workshopId: string, decisionId: string): Promise<FileAnswer> {
    return this.of(await this.parts.decisions.get(workshopId, decisionId));
  }

  /** Refused as not found where nothing was accepted. */
  async of({ workshopId, fileId }: DecisionRow): Promise<FileAnswer> {
    if (fileId === null) throw new Rejection('not-found', 'problem-not-found');
    const { bytes, name, media } = await this.parts.files.read(workshopId, fileId);
    return new FileAnswer(bytes, { name, media });
  }
}
