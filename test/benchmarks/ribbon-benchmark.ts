import { existsSync } from 'node:fs';
import * as path from 'node:path';
import type { Page } from 'playwright-core';
import jestSetUp from '../database/jest-set-up.mjs';
import jestTearDown from '../database/jest-tear-down.mjs';
import { sampleEstimate } from '../api/sample-estimate';
import { programmeOf, shopWith } from '../api/sample-programme';
import { Walk } from '../journeys/walk';
import type { Benchmark, Measure } from './benchmark';
import { frameTimes, shareOf, workCounted, workOf_seconds, type Motion } from './frame-times';
import { sizedRibbon } from './sized-ribbon';

const builtPage = path.resolve(__dirname, '../../dist/web/index.html');
const scroller = 'app-dated-ribbon .scroll';
const kinds: readonly Motion['kind'][] = ['along', 'down', 'zoom'];
const frames = 240;
const empty = `<!doctype html><div class="scroll" style="width:1300px;height:700px;overflow:auto">
  <div style="width:20000px;height:4116px"></div></div>`;

/** The page of a programme with sixty lots of forty steps, in the browser that draws it. */
async function openRibbon(walk: Walk): Promise<Page> {
  const { ours } = walk.api;
  await shopWith(ours, ours.people.bench);
  const { jobId, estimateId } = await sampleEstimate(ours);
  const large = sizedRibbon(await programmeOf(ours, estimateId), 60, 40);
  const { page } = await walk.as('owner');
  await page.route('**/programme', (route) => route.fulfill({ json: large }));
  await page.goto(`${walk.address}/jobs/${jobId}/estimates/${estimateId}/dry?part=programme`);
  await page.locator(scroller).scrollIntoViewIfNeeded();
  return page;
}

async function emptyFrame_ms(walk: Walk): Promise<number> {
  const { page } = await walk.stranger();
  await page.setContent(empty);
  return shareOf(await frameTimes(page, '.scroll', { kind: 'along', frames }), 0.5);
}

async function measuredAt(page: Page, size: 'Week' | 'Month', frame_ms: number): Promise<readonly Measure[]> {
  await page.getByRole('button', { name: size, exact: true }).click();
  await page.waitForTimeout(500);
  const session = await workCounted(page);
  const measures: Measure[] = [];
  for (const kind of kinds) {
    const before = await workOf_seconds(session);
    const times = await frameTimes(page, scroller, { kind, frames });
    const work_ms = (((await workOf_seconds(session)) - before) * 1000) / frames;
    const figure = (what: string, value_ms: number, atMost: number): Measure => ({
      ...{ what: `${size}, ${kind}: ${what}`, figure: value_ms / frame_ms, bound: { atMost } },
      unit: 'of an empty page’s frame',
    });
    measures.push(figure('the middle frame', shareOf(times, 0.5), 1.1));
    measures.push(figure('95 of 100 frames', shareOf(times, 0.95), 2.1));
    measures.push(figure('the page’s own work a frame', work_ms, 0.75));
  }
  return measures;
}

async function measure(): Promise<readonly Measure[]> {
  if (!existsSync(builtPage)) throw new Error('there is no built page in dist/web: npm run build');
  await jestSetUp();
  const walk = await Walk.begin();
  try {
    const frame_ms = await emptyFrame_ms(walk);
    const page = await openRibbon(walk);
    return [...(await measuredAt(page, 'Week', frame_ms)), ...(await measuredAt(page, 'Month', frame_ms))];
  } finally {
    await walk.end();
    await jestTearDown();
  }
}

/** Scrolling and zooming the drying ribbon of a large job; the bounds are this project's own: a frame of sixty a second, and in the worst case every other one. */
export const ribbonBenchmark: Benchmark = { title: 'The drying ribbon: sixty lots of forty steps', measure };
