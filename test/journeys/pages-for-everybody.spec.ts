import { clientPages, memberPages, pagesOfTheApplication, strangerPages } from './pages';
import { setStage, type Stage } from './stage';
import { Walk } from './walk';
import { wrongPages } from './wrong-pages';

/** Every page that is open without an account, and that no page of the application is forgotten. */
let walk: Walk;
let stage: Stage;
beforeAll(async () => {
  walk = await Walk.begin();
  stage = await setStage(walk);
}, 300_000);
afterAll(() => walk.end());

test('every page of the application is among those looked at', () => {
  expect([...new Set(pagesOfTheApplication())].sort()).toEqual(
    [strangerPages, clientPages, memberPages].flatMap(Object.keys).sort(),
  );
});

test('a stranger reads every page that is open to them', async () => {
  const person = await walk.stranger();
  expect(await wrongPages(person, walk.address, Object.values(strangerPages).flat())).toEqual({});
  expect(person.complaints.filter((text) => !text.includes('404') && !text.includes('410'))).toEqual([]);
}, 300_000);

test('a client reads what their link opens', async () => {
  const person = await walk.stranger();
  const paths = Object.values(clientPages).flatMap((addresses) => addresses(stage));
  expect(await wrongPages(person, walk.address, paths)).toEqual({});
  expect(person.complaints).toEqual([]);
}, 300_000);
