import { draftInOrder } from '#shared/estimates/draft-in-order';
import { EstimateServer, ids } from '../../../test/estimate-server';
import { membersSpokenOf } from './members-spoken-of';

const server = new EstimateServer();
const draft = draftInOrder(server.settings, server.pieces, server.members);
const [edge, leg] = draft.members;

describe('membersSpokenOf', () => {
  it.each([
    ['the member of a zone', [edge.zones[0].id], [edge.name]],
    ['each member once, in the order of the draft', [ids.leg, edge.zones[0].id, ids.edge], [edge.name, leg.name]],
    ['nobody where it is of no member', ['extra', 'gone'], []],
  ])('names %s', (_sentence, about, names) => {
    expect(membersSpokenOf(draft, about)).toEqual(names);
  });
});
