import { askForReset, changePassword, resetPassword } from '#shared/accounts/password-endpoints';
import { signIn } from '#shared/accounts/session-endpoints';
import { password, startApi, type Api, type TestPerson } from './start-api';

/** Choosing, changing and forgetting a password (ASVS 6.2, 6.4.1; NIST SP 800-63B-4). */
let api: Api;
beforeAll(async () => {
  api = await startApi();
}, 60_000);
afterAll(() => api.stop());

const change = (person: TestPerson, chosen: string, current = password) =>
  person.visitor.call(changePassword, { body: { current, password: chosen } });
const bench = () => api.newcomer(api.ours, 'bench');
const signsIn = async (email: string, entered: string): Promise<number> =>
  (await (await api.stranger()).signIn(email, entered)).status;

/** A hundred and twenty-eight code points, more bytes, and two units of UTF-16 for the otter. */
const longest = [
  ...'Down by the weir the otter 🦦 keeps its hours, the heron minds them, and whoever gilds at dusk hears both through an open window; so',
]
  .slice(0, 128)
  .join('');

describe('choosing', () => {
  test.each([
    ['14 characters', 'grey otter bow', 400],
    ['15 characters', 'grey otter bows', 204],
    ['128 characters with spaces and pictures', longest, 204],
    ['small letters only', 'greyotterbowsdeep', 204],
  ])('%s', async (_, chosen, status) => {
    expect((await change(await bench(), chosen)).status).toBe(status);
  });

  test('129 characters are refused for their number, nothing is cut off', async () => {
    const response = await change(await bench(), `${longest}x`);
    expect(response.body).toMatchObject({ status: 400, errors: [{ message: 'At most 128 characters, please.' }] });
  });

  test('the longest is as long as it says', () => {
    expect([...longest]).toHaveLength(128);
  });

  test('two passwords alike in their first 72 bytes are two passwords', async () => {
    const person = await bench();
    const beginning = 'herons stand in the weir until the evening and nobody minds them at all, ';
    expect((await change(person, `${beginning}today`)).status).toBe(204);
    expect(await signsIn(person.email, `${beginning}tomorrow`)).toBe(403);
    expect(await signsIn(person.email, `${beginning}today`)).toBe(200);
  });

  test('a space at the end counts', async () => {
    const person = await bench();
    expect((await change(person, 'nine slow otters ')).status).toBe(204);
    expect(await signsIn(person.email, 'nine slow otters')).toBe(403);
    expect(await signsIn(person.email, 'nine slow otters ')).toBe(200);
  });

  test('one keyboard may write what another reads: composed and decomposed letters are the same', async () => {
    const person = await bench();
    expect((await change(person, 'neun träge Füchse'.normalize('NFC'))).status).toBe(204);
    expect(await signsIn(person.email, 'neun träge Füchse'.normalize('NFD'))).toBe(200);
  });

  test('the product, the workshop and the person are refused', async () => {
    const person = await bench();
    for (const chosen of ['my Bolewright entry', 'Herons Carvers 2026', `${person.email} again`]) {
      const response = await change(person, chosen);
      expect(response.status).toBe(400);
      expect(response.body).toMatchObject({ errors: [{ path: ['password'] }] });
    }
  });
});

describe('changing', () => {
  test('needs the current one', async () => {
    const person = await bench();
    expect((await change(person, 'nine slow otters swim', 'not the current one')).status).toBe(403);
    expect((await person.visitor.call(changePassword, { body: { password: 'nine slow otters swim' } })).status).toBe(
      400,
    );
    expect(await signsIn(person.email, password)).toBe(200);
  });

  test('ends what the old one opened', async () => {
    const person = await bench();
    expect((await change(person, 'nine slow otters swim')).status).toBe(204);
    expect(await signsIn(person.email, password)).toBe(403);
    expect(await signsIn(person.email, 'nine slow otters swim')).toBe(200);
  });
});

describe('a mailed link', () => {
  async function linkFor(email: string): Promise<string> {
    await (await api.stranger()).call(askForReset, { body: { email } });
    const [mail] = await api.mails();
    return /#([\w-]+)/.exec(mail?.text ?? '')?.[1] ?? '';
  }
  const use = async (token: string, chosen = 'nine slow otters swim') =>
    (await api.stranger()).call(resetPassword, { body: { token, password: chosen } });

  test('sets a new password once, and ends every session', async () => {
    const person = await bench();
    const token = await linkFor(person.email);
    expect((await use(token)).status).toBe(204);
    expect((await use(token, 'ten quick otters dive')).status).toBe(410);
    expect(await signsIn(person.email, 'nine slow otters swim')).toBe(200);
    expect((await person.visitor.request('get', '/api/people')).status).toBe(401);
  });

  test('ends with any other that is waiting once a password was set, by a link or by its owner', async () => {
    const person = await bench();
    const [first, second, third] = [
      await linkFor(person.email),
      await linkFor(person.email),
      await linkFor(person.email),
    ];
    expect((await use(second)).status).toBe(204);
    expect([(await use(first)).status, (await use(third)).status]).toEqual([410, 410]);
    const other = await bench();
    const waiting = await linkFor(other.email);
    const body = { current: password, password: 'nine slow otters swim' };
    expect((await other.visitor.call(changePassword, { body })).status).toBe(204);
    expect((await use(waiting)).status).toBe(410);
  });

  test('is of no use after ten minutes, nor when made up', async () => {
    const { email } = await bench();
    const token = await linkFor(email);
    api.clock.move({ minutes: 10, seconds: 1 });
    expect((await use(token)).status).toBe(410);
    expect((await use('A'.repeat(43))).status).toBe(410);
  });

  test('stays good when the password chosen was refused', async () => {
    const { email } = await bench();
    const token = await linkFor(email);
    expect((await use(token, 'password password password')).status).toBe(400);
    expect((await use(token)).status).toBe(204);
  });

  test('works once though used twenty times at once', async () => {
    const { email } = await bench();
    const token = await linkFor(email);
    const visitor = await api.stranger();
    const all = await Promise.all(
      Array.from({ length: 20 }, () =>
        visitor.call(resetPassword, { body: { token, password: 'nine slow otters swim' } }),
      ),
    );
    expect(all.filter(({ status }) => status === 204)).toHaveLength(1);
    expect(all.filter(({ status }) => status === 410)).toHaveLength(19);
  });

  test('is a secret of 256 bits in the fragment, kept as a hash and logged nowhere', async () => {
    const { email } = await bench();
    const token = await linkFor(email);
    expect(Buffer.from(token, 'base64url')).toHaveLength(32);
    await use(token);
    const rows = await api.platform.database.select('SELECT * FROM mailed_links');
    expect(JSON.stringify(rows)).not.toContain(token);
    expect(api.logLines.join('')).not.toContain(token);
  });

  test('is mailed three times a quarter of an hour at most', async () => {
    const { email } = await bench();
    for (let count = 0; count < 6; count++) await (await api.stranger()).call(askForReset, { body: { email } });
    const mails = await api.mails();
    expect(mails.filter(({ headers }) => headers.includes(email))).toHaveLength(3);
  });
});

test('an e-mail address is one address, whatever else is put into it', async () => {
  for (const email of ['a@b.example\r\nBcc: all@c.example', 'a@b.example,c@d.example', '"a\r\n"@b.example']) {
    expect((await (await api.stranger()).call(askForReset, { body: { email } })).status).toBe(400);
  }
});

test('a password is asked for as text, not as a question', async () => {
  const visitor = await api.stranger();
  for (const entered of [{ $gt: '' }, ['a'], 1, true, null]) {
    expect((await visitor.call(signIn, { body: { email: 'owner@herons.example', password: entered } })).status).toBe(
      400,
    );
  }
});
