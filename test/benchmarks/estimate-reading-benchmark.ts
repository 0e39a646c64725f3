import express, { type Express } from 'express';
import { v7 as newId } from 'uuid';
import { changeEstimate } from '#shared/estimates/estimates-endpoints';
import { Sessions } from '../../backend/src/platform/http/sessions';
import { SessionStore } from '../../backend/src/platform/session/session-store';
import { sampleEstimate } from '../api/sample-estimate';
import type { Api } from '../api/start-api';
import type { Benchmark, Measure } from './benchmark';
import { listen, slowestOf95, withApi } from './served-api';
import { sizedEstimate } from './sized-estimate';

const members = 200;

/** An estimate of 200 members with 600 zones and 800 ornaments, entered through the application beside one that is there. */
async function largeEstimate(api: Api): Promise<string> {
  const { estimateId, pieceId } = await sampleEstimate(api.ours);
  const entered = sizedEstimate(members).draft.members.map((member) => {
    const { id, ...content } = withNewIds(member);
    return { kind: 'member', id, version: 0, content: { ...content, pieceId, place: member.place + 2 } };
  });
  for (let from = 0; from < entered.length; from += 50) {
    const body = { changes: entered.slice(from, from + 50) };
    const { status, text } = await api.as('owner').call(changeEstimate, { params: { estimateId }, body });
    if (status !== 200) throw new Error(`the members were not kept: ${status} ${text.slice(0, 500)}`);
  }
  return estimateId;
}

/** The member under ids such as the application takes. */
function withNewIds<T>(member: T): T {
  const ids = new Map<string, string>();
  const renamed = JSON.stringify(member).replace(/"member \d+( (zone|ornament) \d+)?"/g, (name) => {
    ids.set(name, ids.get(name) ?? JSON.stringify(newId()));
    return ids.get(name) ?? name;
  });
  return JSON.parse(renamed) as T;
}

/** A route with nothing round it but the session check: the same stored bytes out of the same database. */
function bareRoute({ platform, app, ours }: Api, estimateId: string): Express {
  const { config, database, clock } = platform;
  const bare = express();
  const sessions = new Sessions(
    config,
    new SessionStore(database, clock),
    app.accounts.identities,
    app.agreements.visits,
  );
  bare.use(sessions.middleware());
  bare.get('/bare', async (request, response) => {
    if (!request.user) return void response.status(401).end();
    const [row] = await database.select<{ bytes: Buffer }>(
      "SELECT bytes FROM estimate_readings WHERE workshop_id = :workshopId AND id = :estimateId AND audience = 'cost'",
      { workshopId: ours.id, estimateId },
    );
    response.type('json').set('Content-Encoding', 'gzip').end(row?.bytes);
  });
  return bare;
}

/** Both in turn, three times, so that what else the machine does falls on both; the middle of three. */
async function inTurn(api: Api, estimateId: string): Promise<{ ours: number; bare: number }> {
  const { cookie } = api.ours.people.owner.visitor;
  const [application, bare] = [await listen(api.app.web.express), await listen(bareRoute(api, estimateId))];
  const times: { ours: number; bare: number }[] = [];
  for (let round = 0; round < 3; round++) {
    times.push({
      bare: await slowestOf95(`${bare.address}/bare`, cookie, 4),
      ours: await slowestOf95(`${application.address}/api/estimates/${estimateId}`, cookie, 4),
    });
  }
  await application.stop();
  await bare.stop();
  const middle = (pick: 'ours' | 'bare') => times.map((one) => one[pick]).sort((a, b) => a - b)[1] ?? Number.NaN;
  return { ours: middle('ours'), bare: middle('bare') };
}

const measure = (): Promise<readonly Measure[]> =>
  withApi(async (api) => {
    const { ours, bare } = await inTurn(api, await largeEstimate(api));
    return [
      {
        what: `reading ${members} members, 600 zones and 800 ornaments at 20 connections, 95 of 100, against a bare route`,
        figure: ours / bare,
        unit: 'times',
        bound: { atMost: 3 },
      },
    ];
  });

/** What the application adds to sending stored bytes. */
export const estimateReadingBenchmark: Benchmark = { title: 'Reading a large estimate', measure };
