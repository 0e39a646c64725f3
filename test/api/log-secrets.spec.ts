import { faultsOfLog, noteCookie, noteSecretsOf } from './faults-of-log';

/** Every spec that starts a server has its log searched when it stops; here the search itself is tried (ASVS 16.2.5, 16.4.1). */
const line = (event: object): string => `${JSON.stringify(event)}\n`;
const id = 'kJ3x9Qm2Vt7Lr4Zp8Wc6Yb1Nd5Hf0Gs2Ae9Ru7Ti4Oq';

beforeAll(() => {
  noteCookie(`s%3A${id}.c2lnbmF0dXJlLW9mLXRoZS1zZXNzaW9uLWlk`);
  noteSecretsOf({ password: 'seven quiet otters doze', token: 'T0k3n_of-a_mailed-link_that_nobody_reads_xyz' });
});

test.each([
  ['the id of a session', line({ path: `/api/sessions/${id}` })],
  ['a token of a mailed link', line({ msg: 'opened T0k3n_of-a_mailed-link_that_nobody_reads_xyz' })],
  ['a password', line({ error: { message: 'refused "seven quiet otters doze"' } })],
  ['a text of the other workshop', line({ name: 'Kanarienvogel Carvers' })],
  ['a hash of a password', line({ row: '$argon2id$v=19$m=19456' })],
  ['two lines', `${line({ a: 1 })}${line({ level: 60, msg: 'forged' })}`],
  ['no event', 'something else\n'],
])('a log with %s is found out', (_, logged) => {
  expect(faultsOfLog([line({ msg: 'request' }), logged])).toHaveLength(1);
});

test('a log of numbers and names of requests is in order', () => {
  const event = { requestId: '01a23180-8bff-758d-a2fd-e2a2c9d9a199', path: '/api/jobs', status: 200 };
  expect(faultsOfLog([line(event), line({ msg: 'refused', refusal: 'problem-not-found' })])).toEqual([]);
});
