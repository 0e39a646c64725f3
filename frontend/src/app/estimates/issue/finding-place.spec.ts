import { draftInOrder } from '#shared/estimates/draft-in-order';
import { EstimateServer, ids } from '../../../test/estimate-server';
import { findingPlace } from './finding-place';

const server = new EstimateServer();
const extra = {
  ...{ id: 'extra', name: 'Crate', taxCategoryId: 'standard', memberId: null, alternativeId: null },
  kind: 'bought-in',
  cost: '180',
} as const;
const draft = draftInOrder({ ...server.settings, extras: [extra] }, server.pieces, server.members);
const zoneId = draft.members[0].zones[0].id;

describe('findingPlace', () => {
  it.each([
    ['a member to its measures', ids.leg, { place: 'measure', query: { member: ids.leg } }],
    ['a zone to the gilding of its member', zoneId, { place: 'gild', query: { member: ids.edge } }],
    ['a further line to the price', 'extra', { place: 'price', query: { part: 'extras' } }],
    ['what is gone nowhere', 'gone', undefined],
    ['the estimate as a whole nowhere', undefined, undefined],
  ])('leads %s', (_, about, place) => {
    expect(findingPlace(draft, about)).toEqual(place);
  });
});
