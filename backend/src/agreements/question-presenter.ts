import type { Question } from '#shared/agreements/question-schema';
import type { QuestionRow } from './question-model';

export const presentQuestion = (row: QuestionRow): Question => ({
  id: row.id,
  issueId: row.issueId,
  author: row.author,
  name: row.name,
  text: row.text,
  at: row.at.toISOString(),
});
