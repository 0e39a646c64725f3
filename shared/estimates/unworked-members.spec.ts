import { draftForSpecs, memberForSpecs, ornamentForSpecs } from '#shared/estimates/member-for-specs';
import { unworkedMembers } from '#shared/estimates/unworked-members';

describe('unworkedMembers', () => {
  it('finds members with neither zone nor ornament nor a line of the price', () => {
    const draft = draftForSpecs([
      memberForSpecs({ id: 'gilt' }),
      memberForSpecs({ id: 'carved', zones: [], ornaments: [ornamentForSpecs()] }),
      memberForSpecs({ id: 'packed', zones: [] }),
      memberForSpecs({ id: 'bare', zones: [] }),
    ]);
    const lines = [{ memberId: null }, { memberId: 'packed' }];
    expect(unworkedMembers(draft, lines).map(({ id }) => id)).toEqual(['bare']);
  });
});
