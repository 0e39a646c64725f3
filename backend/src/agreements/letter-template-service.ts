import { v7 as newId } from 'uuid';
import type { Actor } from '#shared/actor/actor';
import { letterComplaints, type LetterText } from '#shared/agreements/letter-complaints';
import { letterKinds, letterPlaceholders, type LetterKind } from '#shared/agreements/letter-kinds';
import type { LetterTemplate } from '#shared/agreements/letter-template-schema';
import { Rejection } from '#shared/problems/rejection';
import type { AuditService } from '../audit';
import { words } from '../platform/http/words';
import { atOf, keepingOf } from '../platform/database/keeping';
import type { LetterTemplateRow } from './letter-template-model';
import type { LetterTemplateRepository } from './letter-template-repository';

interface Parts {
  readonly templates: LetterTemplateRepository;
  readonly audit: AuditService;
}

/** The words a kind of letter has of itself: its placeholders stand for themselves. */
function usualWords(kind: LetterKind): LetterText {
  const braces = Object.fromEntries(letterPlaceholders[kind].map((name) => [name, `{${name}}`]));
  return { subject: words(`letter-${kind}-subject`, braces), text: words(`letter-${kind}-text`, braces) };
}

const templateOf = (kind: LetterKind, row: LetterTemplateRow | undefined): LetterTemplate => {
  const { subject, text } = row ?? usualWords(kind);
  return { kind, subject, text, version: row?.version ?? 0, placeholders: [...letterPlaceholders[kind]] };
};

/** Refuses words with braces that hold nothing known, or without what the letter is of no use without. */
export function refuseFaulty(kind: LetterKind, text: LetterText): void {
  const complaints = letterComplaints(kind, text);
  if (complaints.length > 0) throw new Rejection('invalid', 'problem-invalid', { complaints });
}

/** The words of letters to clients: the usual ones, or the workshop's own. */
export class LetterTemplateService {
  constructor(private readonly parts: Parts) {}

  async all(workshopId: string): Promise<LetterTemplate[]> {
    const rows = await this.parts.templates.list(workshopId);
    return letterKinds.map((kind) =>
      templateOf(
        kind,
        rows.find((row) => row.kind === kind),
      ),
    );
  }

  async get(workshopId: string, kind: LetterKind): Promise<LetterTemplate> {
    return templateOf(kind, await this.parts.templates.ofKind(workshopId, kind));
  }

  /** A row as it stands, for whoever wanted to change another version of it. */
  readonly present = (row: LetterTemplateRow): LetterTemplate => templateOf(row.kind, row);

  async keep(actor: Actor, at: { kind: LetterKind; version: number }, text: LetterText): Promise<LetterTemplate> {
    const { kind, version } = at;
    refuseFaulty(kind, text);
    const { workshopId } = actor;
    const keeping = keepingOf(await this.parts.templates.ofKind(workshopId, kind), version, text);
    if (keeping.is === 'repeat') return templateOf(kind, keeping.row);
    const row =
      keeping.is === 'entry'
        ? await this.parts.templates.insert(workshopId, { id: newId(), kind, version: 1, ...text })
        : await this.parts.templates.change(workshopId, atOf(keeping.from), text);
    await this.parts.audit.record(actor, {
      subject: { kind: 'letter', id: row.id },
      code: 'history-letter-template-changed',
      before: keeping.is === 'change' ? { subject: keeping.from.subject, text: keeping.from.text } : usualWords(kind),
      after: text,
    });
    return templateOf(kind, row);
  }

  /** Back to the usual words; harmless where there are no others. */
  async reset(actor: Actor, kind: LetterKind): Promise<LetterTemplate> {
    const row = await this.parts.templates.ofKind(actor.workshopId, kind);
    if (!row) return templateOf(kind, undefined);
    await this.parts.templates.remove(actor.workshopId, row.id);
    await this.parts.audit.record(actor, {
      subject: { kind: 'letter', id: row.id },
      code: 'history-letter-template-reset',
      before: { subject: row.subject, text: row.text },
      after: usualWords(kind),
    });
    return templateOf(kind, undefined);
  }
}
