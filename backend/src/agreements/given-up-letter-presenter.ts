import type { GivenUpLetter } from '../platform/mail/mailbox';

export const presentGivenUpLetter = (letter: GivenUpLetter) => ({
  id: letter.id,
  to: letter.to,
  subject: letter.subject,
  attempts: letter.attempts,
  writtenAt: letter.createdAt.toISOString(),
  givenUpAt: letter.failedAt.toISOString(),
  lastError: letter.lastError,
});
