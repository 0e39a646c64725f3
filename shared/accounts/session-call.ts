/** What every first page asks, without the schema of its answer. */
export const readSessionCall = {
  name: 'readSession',
  summary: 'Who is signed in, and the token that changing requests must carry.',
  method: 'get',
  path: '/api/session',
  callers: 'anyone',
} as const;
