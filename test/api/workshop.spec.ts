import { readdir } from 'node:fs/promises';
import { join } from 'node:path';
import sharp from 'sharp';
import { readSession } from '#shared/accounts/session-endpoints';
import type { SessionAnswer } from '#shared/accounts/session-schema';
import { changeWorkshop, putLogo, readLogo, readWorkshop, removeLogo } from '#shared/accounts/workshop-endpoints';
import { startApi, type Api } from './start-api';
import { sampleEstimate } from './sample-estimate';
import { foundingSettings } from './test-workshop';

/** The settings of a workshop, and pictures from outside (ASVS 5.2.1, 5.2.2, 5.3.1, 5.3.2, 1.3.4). */
let api: Api;
beforeAll(async () => {
  api = await startApi();
}, 60_000);
afterAll(() => api.stop());

const owner = () => api.as('owner');
const version = async (): Promise<number> => ((await owner().call(readWorkshop)).body as { version: number }).version;
const settings = {
  name: 'Herons Carvers',
  ...foundingSettings,
  addressLines: ['1 Weir Lane'],
  telephone: '',
  email: 'post@herons.example',
  taxRegistration: 'ATU00000000',
  defaultTaxCategory: 'S',
};
const change = async (changed: object) =>
  owner().call(changeWorkshop, { version: await version(), body: { ...settings, ...changed } });

/** The code of the tax a new estimate begins with. */
async function taxOfNewEstimate(workshopId: string, estimateId: string): Promise<string | undefined> {
  const { settings, rateCardId } = (await api.app.estimates.drafts.whole(workshopId, estimateId)).estimate;
  const { money } = await api.app.rateCards.service.card(workshopId, rateCardId);
  return money.taxCategories.find(({ id }) => id === settings.taxCategoryId)?.code;
}

test('the usual tax category is what a page is told for invoices; estimates keep to the card', async () => {
  const taxOf = async () => taxOfNewEstimate(api.ours.id, (await sampleEstimate(api.ours)).estimateId);
  const told = async () => (await owner().call(readSession)).body as SessionAnswer;
  expect([await taxOf(), (await told()).signedIn?.workshop?.defaultTaxCategory]).toEqual(['S', 'S']);
  expect((await change({ defaultTaxCategory: 'O' })).status).toBe(200);
  expect([await taxOf(), (await told()).signedIn?.workshop?.defaultTaxCategory]).toEqual(['S', 'O']);
  expect((await change({})).status).toBe(200);
});

test('a workshop where no value added tax is levied begins outside its scope', async () => {
  const { accountId, name } = api.ours.people.owner.actor;
  const habits = {
    ...foundingSettings,
    name: 'Weir Carvers',
    country: 'US',
    currency: 'USD',
    lengthUnit: 'in',
  } as const;
  const id = await api.platform.database.transaction(() =>
    api.app.accounts.workshops.found({ accountId, name }, habits),
  );
  expect((await api.app.accounts.workshops.get(id)).defaultTaxCategory).toBe('O');
  const { money } = (await api.app.rateCards.service.inForce(id)).content;
  expect(money.taxCategories.find((tax) => tax.id === money.defaultTaxCategoryId)?.code).toBe('O');
});

test.each([
  ['a currency that is none', { currency: 'XXY' }, 'currency'],
  ['a time zone that is none', { timeZone: 'Europe/Atlantis' }, 'timeZone'],
  ['a locale that is none', { locale: 'en_GB!' }, 'locale'],
  ['another paper', { paperSize: 'A3' }, 'paperSize'],
  ['another unit', { lengthUnit: 'ell' }, 'lengthUnit'],
  ['a country written out', { country: 'Austria' }, 'country'],
  ['no name', { name: '   ' }, 'name'],
  ['a name of two lines', { name: 'Herons\nCarvers' }, 'name'],
  ['a tax category that is none', { defaultTaxCategory: 'Q' }, 'defaultTaxCategory'],
  ['another workshop’s id', { id: '00000000-0000-4000-8000-000000000000' }, 'id'],
  ['a version in the body', { version: 99 }, 'version'],
])('settings with %s are refused at that entry', async (_, changed, path) => {
  const response = await change(changed);
  expect(response.status).toBe(400);
  expect(response.body).toMatchObject({ errors: [{ path: [path] }] });
});

test('all complaints come at once, worded', async () => {
  const { body } = await change({ currency: 'XXY', country: 'Austria', name: '' });
  const { errors } = body as { errors: { path: string[]; message: string }[] };
  expect(errors.map(({ path }) => path[0]).sort()).toEqual(['country', 'currency', 'name']);
  for (const { message } of errors) expect(message).toMatch(/^[A-Z].+\.$/);
});

test('settings are written from the version seen; from an older one both sides are shown', async () => {
  const seen = await version();
  const first = await owner().call(changeWorkshop, { version: seen, body: { ...settings, telephone: '111' } });
  expect(first.headers['etag']).toBe(`"${seen + 1}"`);
  const second = await owner().call(changeWorkshop, { version: seen, body: { ...settings, telephone: '222' } });
  expect(second.status).toBe(412);
  expect(second.body).toMatchObject({ current: { telephone: '111', version: seen + 1 } });
});

describe('a picture', () => {
  const png = () =>
    sharp({ create: { width: 60, height: 30, channels: 4, background: '#c9a24b' } })
      .png()
      .toBuffer();
  const put = async (name: string, bytes: Buffer) =>
    owner().call(putLogo, { version: await version(), file: { name, bytes } });

  test('is drawn anew: what was hidden in it is gone', async () => {
    const withSecret = await sharp(await png())
      .withExif({ IFD0: { Copyright: 'HIDDEN-EXIF' } })
      .jpeg()
      .toBuffer();
    const polyglot = Buffer.concat([withSecret, Buffer.from('<script>alert(1)</script><?php echo 1 ?>')]);
    expect((await put('mark.jpg', polyglot)).status).toBe(200);
    const { body } = await owner().call(readLogo).responseType('blob');
    const text = (body as Buffer).toString('latin1');
    expect(text).not.toMatch(/HIDDEN-EXIF|<script>|<\?php/);
    expect(await sharp(body as Buffer).metadata()).toMatchObject({ format: 'png', width: 60, height: 30 });
  });

  test.each([
    [
      'an SVG with a script',
      'mark.svg',
      Buffer.from('<svg xmlns="http://www.w3.org/2000/svg"><script>alert(1)</script></svg>'),
    ],
    [
      'an SVG under another name',
      'mark.png',
      Buffer.from('<svg xmlns="http://www.w3.org/2000/svg" width="9" height="9"/>'),
    ],
    ['a page under a picture’s name', 'mark.jpg', Buffer.from('<!doctype html><script>alert(1)</script>')],
    ['a program under a picture’s name', 'mark.png', Buffer.from('MZ\u0090\u0000\u0003\u0000\u0000\u0000')],
    ['nothing', 'mark.png', Buffer.alloc(0)],
    ['half a picture', 'mark.png', Buffer.from('iVBORw0KGgoAAAANSUhEUgAAAAEAAAABCAYAAAAfFcSJ', 'base64')],
  ])('that is %s is refused', async (_, name, bytes) => {
    expect((await put(name, bytes)).status).toBe(415);
  });

  test.each(['mark.png.php', 'mark.php.png', 'mark', 'mark.gif', 'mark.jpg'])(
    'called %j is refused when it is a PNG',
    async (name) => {
      expect((await put(name, await png())).status).toBe(415);
    },
  );

  test('with a NUL in its name is refused', async () => {
    expect([400, 415]).toContain((await put('mark.png\u0000.jpg', await png())).status);
  });

  test('of more pixels than memory should hold is refused before it is unpacked', async () => {
    const wide = await sharp({ create: { width: 12_000, height: 6_000, channels: 3, background: '#fff' } })
      .png()
      .toBuffer();
    const before = process.memoryUsage().rss;
    expect((await put('wide.png', wide)).status).toBe(413);
    expect(process.memoryUsage().rss - before).toBeLessThan(100 * 1024 * 1024);
  }, 30_000);

  test('of one byte more than 20 MB is refused', async () => {
    expect((await put('big.png', Buffer.alloc(20 * 1024 * 1024 + 1))).status).toBe(413);
  });

  test.each(['../../outside.png', 'C:\\outside.png', `${'n'.repeat(300)}.png`, 'a;rm -rf $(x).png', 'Größe “1”.png'])(
    'called %j lies under its own hash and nowhere else',
    async (name) => {
      expect((await put(name, await png())).status).toBe(200);
      const folder = join(api.platform.config.dataFolder, 'files');
      const found = (await readdir(folder, { recursive: true })).filter((path) => path.split('/').length === 3);
      for (const path of found) expect(path).toMatch(new RegExp(`^${api.ours.id}/[0-9a-f]{2}/[0-9a-f]{64}$`));
    },
  );

  test('of another workshop is not there', async () => {
    await put('mark.png', await png());
    expect((await api.theirs.people.owner.visitor.call(readLogo)).status).toBe(404);
  });

  test('is gone from the letterhead when it is taken off', async () => {
    await put('mark.png', await png());
    expect((await owner().call(removeLogo, { version: await version() })).body).toMatchObject({ logoFileId: null });
    expect((await owner().call(readLogo)).status).toBe(404);
  });
});

test('without a file the picture is asked for', async () => {
  const response = await owner()
    .request('put', putLogo.path)
    .set('x-csrf-token', owner().token)
    .set('if-match', `"${await version()}"`)
    .field('note', 'x');
  expect(response.status).toBe(400);
});
