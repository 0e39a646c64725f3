import { violations } from './violations';
import { openings, openingsOfTheApplication } from './openings';
import { screens, turnTo } from './screens';
import { setStage, type Scene } from './stage';
import { Walk } from './walk';

/** Every dialog, menu and list of choices by axe, in both themes, on a phone of 320 px and at a desk; found in the sources. */
let walk: Walk;
let scene: Scene;
beforeAll(async () => {
  walk = await Walk.begin();
  const { ours, theirs, app } = walk.api;
  const { accountId, name } = ours.people.owner.actor;
  scene = { ...(await setStage(walk)), person: await walk.as('owner') };
  await app.accounts.workshops.join(theirs.id, { accountId, name, roles: ['bench'] });
}, 300_000);
afterAll(() => walk.end());

const layers = '.cdk-overlay-pane :is([role=menu], [role=dialog], [role=listbox])';

/** An open layer whose edges lie outside the screen, or whose content is wider than itself, cannot be read. */
const isCutOff = `(() => [...document.querySelectorAll('.cdk-overlay-pane')].some((pane) => {
  const { left, right, top, bottom } = pane.getBoundingClientRect();
  return left < 0 || top < 0 || right > innerWidth + 1 || bottom > innerHeight + 1 ||
    [...pane.querySelectorAll('[role=dialog], mat-dialog-content')].some((one) => one.scrollWidth > one.clientWidth + 1);
}))()`;

test('each of them is known here', () => {
  expect(Object.keys(openings).sort()).toEqual([...new Set(openingsOfTheApplication())].sort());
});

test.each(Object.entries(openings))(
  '%s',
  async (name, open) => {
    const { page, see } = scene.person;
    await turnTo(page, { width: 1280, height: 800 });
    const putRight = await open(scene);
    await page.locator(layers).first().waitFor();
    await page.waitForTimeout(250);
    const found: string[] = [];
    for (const [where, screen] of screens) {
      await turnTo(page, screen);
      await see(`over ${name.replaceAll('/', '-')} ${where}`);
      expect(await page.locator(layers).first().isVisible()).toBe(true);
      found.push(
        ...(await violations(page, { within: '.cdk-overlay-pane', contrastAlone: screen.dark })).map(
          (text) => `${where}: ${text}`,
        ),
      );
      if (await page.evaluate<boolean>(isCutOff)) found.push(`${where}: reaches past the screen`);
    }
    expect(found).toEqual([]);
    await putRight?.();
  },
  60_000,
);

test('none of them made the browser complain', () => {
  expect(scene.person.complaints.filter((text) => !/status of (401|412)/.test(text))).toEqual([]);
});
