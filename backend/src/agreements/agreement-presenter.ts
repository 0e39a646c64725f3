import type { Access } from '#shared/agreements/access-schema';
import type { Contract } from '#shared/agreements/contract';
import type { Decision } from '#shared/agreements/decision-schema';
import type { Question } from '#shared/agreements/question-schema';
import type { GivenUpLetter } from '../platform/mail/mailbox';
import type { ClientAccessRow } from './client-access-model';
import type { DecisionRow } from './decision-model';
import type { QuestionRow } from './question-model';

/** Never the hash of its secret. */
export const presentAccess = (row: ClientAccessRow): Access => ({
  id: row.id,
  purpose: row.purpose,
  createdAt: row.createdAt.toISOString(),
  createdBy: row.createdBy,
  endsAt: row.endsAt.toISOString(),
  revokedAt: row.revokedAt?.toISOString() ?? null,
  openedAt: row.openedAt?.toISOString() ?? null,
});

export const presentQuestion = (row: QuestionRow): Question => ({
  id: row.id,
  issueId: row.issueId,
  author: row.author,
  name: row.name,
  text: row.text,
  at: row.at.toISOString(),
});

export const presentDecision = (row: DecisionRow): Decision => ({
  id: row.id,
  issueId: row.issueId,
  kind: row.kind,
  typedName: row.typedName,
  at: row.at.toISOString(),
  address: row.address,
  choice: [...row.choice],
  reason: row.reason,
  net_minor: row.netMinor,
  tax_minor: row.taxMinor,
  gross_minor: row.grossMinor,
  pdfSha256: row.pdfSha256,
});

export const presentGivenUp = (letter: GivenUpLetter) => ({
  id: letter.id,
  to: letter.to,
  subject: letter.subject,
  attempts: letter.attempts,
  writtenAt: letter.createdAt.toISOString(),
  givenUpAt: letter.failedAt.toISOString(),
  lastError: letter.lastError,
});

export const presentContract = ({ parts, ...contract }: Contract) => ({
  ...contract,
  parts: parts.map(({ choice, taxes, plan, stageNames, ...part }) => ({
    ...part,
    choice: [...choice],
    taxes: [...taxes],
    plan: { ...plan, stages_percent: [...plan.stages_percent] },
    stageNames: [...stageNames],
  })),
});
