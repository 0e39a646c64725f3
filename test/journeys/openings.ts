import type { Page } from 'playwright-core';
import { changeEstimate } from '#shared/estimates/estimates-endpoints';
import { sourceFiles } from './pages';
import { done, type Scene } from './stage';

/** Opens something over the page; answers what puts right what it had to disturb. */
export type Opening = (scene: Scene) => Promise<void | (() => Promise<void>)>;

const named = (texts: readonly { readonly path: string; readonly text: string }[], pattern: RegExp, word: string) =>
  texts.flatMap(({ path, text }) =>
    [...text.matchAll(pattern)].map(([, name = '']) => `${path} ${word} ${name}`.trim()),
  );

/** Every dialog, question, menu and list of choices the sources open over a page. */
export function openingsOfTheApplication(): string[] {
  const all = sourceFiles('.ts', '.html');
  const dialogs = all
    .filter(
      ({ path, text }) => /MatDialog\b|MatBottomSheet\b|\bOverlay\b/.test(text) && path !== 'ui/dialog/confirm.ts',
    )
    .flatMap(({ text }) => [...text.matchAll(/\.open(?:<[^(]*>)?\(\s*([A-Z]\w+)/g)].map(([, name]) => name ?? ''));
  return [
    ...dialogs,
    ...named(all, /<mat-menu\s+#(\w+)/g, 'menu'),
    ...named(all, /<mat-autocomplete\s+#(\w+)/g, 'choices'),
    ...named(all, /(?:\bconfirm|inject\(Confirm\))\.ask\(()/g, 'question'),
    ...named(all, /showModal\(()|\[cdkConnectedOverlay\]|\bpopover(?:=|\b)(?=[^.]*>)/g, 'layer'),
  ];
}

async function to({ person, walk }: Scene, path: string): Promise<Page> {
  await person.page.goto(walk.address + path);
  await person.page.getByRole('heading').first().waitFor();
  return person.page;
}

const place = (scene: Scene, name: string, query = `?member=${scene.sample.memberId}`): Promise<Page> =>
  to(scene, `/jobs/${scene.sample.jobId}/estimates/${scene.sample.estimateId}/${name}${query}`);

const press = (page: Page, name: string | RegExp): Promise<void> =>
  page
    .getByRole('button', { name, exact: typeof name === 'string' })
    .first()
    .click();

const choose = (page: Page, name: string): Promise<void> => page.getByRole('menuitem', { name, exact: true }).click();

async function accountMenu(scene: Scene): Promise<Page> {
  const page = await to(scene, '/profile');
  await page.locator('app-account-menu .opener').click();
  return page;
}

async function listMenu(scene: Scene): Promise<Page> {
  const page = await place(scene, 'measure');
  await press(page, 'More for the list');
  return page;
}

async function cardMenu(scene: Scene): Promise<Page> {
  const page = await to(scene, `/rates/${scene.rateCardId}/labour`);
  await press(page, 'More');
  return page;
}

async function contentOfMember({ walk, sample }: Scene) {
  const { members } = await walk.api.app.estimates.drafts.whole(walk.api.ours.id, sample.estimateId);
  const member = members.find(({ id }) => id === sample.memberId);
  if (!member) throw new Error('the member is gone');
  return member;
}

async function typeOtherCount(page: Page): Promise<void> {
  const entry = page.getByLabel('How many').first();
  await entry.fill(String(Number(await entry.inputValue()) + 1));
}

/** Somebody else changes the member while it stands open here. */
const staleMember: Opening = async (scene) => {
  const page = await place(scene, 'measure');
  await page.getByLabel('How many').first().waitFor();
  const { id, version, content } = await contentOfMember(scene);
  const changes = [{ kind: 'member', id, version, content: { ...content, count: content.count + 6 } }];
  await done(scene.walk, changeEstimate, { params: { estimateId: scene.sample.estimateId }, body: { changes } });
  await typeOtherCount(page);
  return () => press(page, /theirs/i);
};

/** The session is gone when the next entry is to be kept. */
const endedSession: Opening = async (scene) => {
  const page = await place(scene, 'measure');
  const cookies = await scene.person.context.cookies();
  await scene.person.context.clearCookies();
  await typeOtherCount(page);
  return async () => {
    // The page has begun a session without a name meanwhile: with the old cookie and the new token it would be refused.
    await page.goto('about:blank');
    await scene.person.context.addCookies(cookies);
  };
};

/** How each of them is reached. */
export const openings: Readonly<Record<string, Opening>> = {
  'shell/account-menu.html menu menu': async (scene) => void (await accountMenu(scene)),
  'shell/account-menu.html menu workshops': async (scene) => choose(await accountMenu(scene), 'Another workshop'),
  'shell/account-menu.html menu themes': async (scene) => choose(await accountMenu(scene), 'Light or dark'),
  'estimates/measure-page.html menu more': async (scene) =>
    (await place(scene, 'measure')).locator('app-member-place header button').click(),
  'estimates/members/member-list.html menu more': async (scene) => void (await listMenu(scene)),
  'estimates/members/member-list.html menu pieceMenu': async (scene) =>
    (await place(scene, 'measure')).locator('.piece-head button').first().click(),
  'rate-cards/card-page.html menu more': async (scene) => void (await cardMenu(scene)),
  'jobs/client-field.html choices choices': async (scene) =>
    (await to(scene, '/jobs/new')).getByRole('combobox', { name: 'Client' }).fill('He'),
  'carving/ornament-picker.ts choices list': async (scene) =>
    (await place(scene, 'carve')).getByRole('combobox', { name: 'Add an ornament' }).fill('a'),
  ClientDialog: async (scene) => {
    const page = await to(scene, '/jobs/new');
    await page.getByRole('combobox', { name: 'Client' }).fill('Nobody known');
    await page.getByRole('option', { name: /as a new client/ }).click();
  },
  ShapeDialog: async (scene) => choose(await listMenu(scene), 'Add a member'),
  NameDialog: async (scene) => choose(await listMenu(scene), 'Add a piece'),
  PasteDialog: async (scene) => {
    const page = await listMenu(scene);
    await choose(page, 'Paste rows of a spreadsheet');
    await page.getByRole('dialog').getByRole('textbox').fill('Rail\t2\t1200\t150\nStile\tmany\t-5\tx');
  },
  SpreadDialog: async (scene) => press(await place(scene, 'gild'), 'Lay it elsewhere too'),
  StaleDialog: staleMember,
  SignInDialog: endedSession,
  'jobs/client-page.ts question': async (scene) =>
    press(await to(scene, `/clients/${scene.bareClientId}`), 'Remove the client'),
  'jobs/job-page.ts question': async (scene) => press(await to(scene, `/jobs/${scene.bareJobId}`), 'Remove the job'),
  'ui/dialog/leave-guard.ts question': async (scene) => {
    const page = await to(scene, '/clients/new');
    await page.getByLabel('Name', { exact: true }).fill('Half entered');
    await page.locator('nav.rail a[href="/jobs"]').click();
  },
  'estimates/issue/mark-form.ts question': async (scene) => {
    const { jobId, estimateId, issueId } = scene.issued;
    const page = await to(scene, `/jobs/${jobId}/estimates/${estimateId}/issue/${issueId}`);
    await page.locator('app-mark-form select').selectOption({ label: 'accepted' });
    await press(page, 'Mark it');
  },
  'agreements/issue-sending.ts question': async (scene) => {
    const { jobId, estimateId, issueId } = scene.sent[0];
    await press(await to(scene, `/jobs/${jobId}/estimates/${estimateId}/issue/${issueId}`), 'Take it back');
  },
  'agreements/letter-form.ts question': async (scene) =>
    press(await to(scene, '/letters?kind=receipt'), 'Back to the first words'),
  'programme/calendars/calendar-feeds.ts question': async (scene) =>
    press(await to(scene, '/programme/calendars'), 'Take it back'),
  'invoices/invoice-draft.ts question': async (scene) =>
    press(await to(scene, `/accounts/invoices/${scene.books.draftId}`), 'Remove the draft'),
  'rate-cards/changes/put-in-force-form.ts question': async (scene) => {
    const page = await to(scene, `/rates/${scene.rateCardId}/changes`);
    const button = page.getByRole('button', { name: /^Put in force/ });
    for (let tries = 0; tries < 60 && !(await button.isEnabled().catch(() => false)); tries++) {
      await scene.walk.api.platform.tasks.runDue();
      await page.waitForTimeout(250);
    }
    await button.click();
  },
  'rate-cards/card-page.ts question': async (scene) => choose(await cardMenu(scene), 'Remove this draft'),
};
