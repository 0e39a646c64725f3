import { buildWhatChanged } from '../../backend/bin/build.mjs';
import setUp from '../database/jest-set-up.mjs';

/** Journeys walk through the pages as they are built, on a throw-away database. */
export default async function builtPages() {
  await buildWhatChanged(console.log, { withPages: true });
  await setUp();
}
