import type { Client, ClientContent } from '#shared/jobs/client-schema';
import type { ClientRow } from './client-model';

/** What a person entered, as the form and the history have it. */
export const presentClientContent = (row: ClientRow): ClientContent => ({
  name: row.name,
  kind: row.kind,
  contact: row.contact,
  email: row.email,
  telephone: row.telephone,
  address: row.address,
  website: row.website,
  taxRegistration: row.taxRegistration,
  note: row.note,
});

export const presentClient = (row: ClientRow): Client => ({
  ...presentClientContent(row),
  id: row.id,
  version: row.version,
  jobs: row.jobs,
});
