import { memberPages } from './pages';
import { setStage, type Stage } from './stage';
import { Walk } from './walk';
import { wrongPages } from './wrong-pages';

/** Every page of a workshop, as its owner sees it. */
let walk: Walk;
let stage: Stage;
beforeAll(async () => {
  walk = await Walk.begin();
  stage = await setStage(walk);
}, 300_000);
afterAll(() => walk.end());

// In four parts, so that a slow machine has the time each of them takes.
test.each([0, 1, 2, 3])(
  'the owner reads every page of the workshop, part %i of them',
  async (part) => {
    const person = await walk.as('owner');
    const paths = Object.values(memberPages).flatMap((addresses) => addresses(stage));
    const ofPart = paths.filter((_, at) => at % 4 === part);
    expect(ofPart.length).toBeGreaterThan(5);
    expect(await wrongPages(person, walk.address, ofPart)).toEqual({});
    expect(person.complaints).toEqual([]);
  },
  400_000,
);
