import { rolesSchema } from '#shared/actor/role-schema';
import { complaintsOf } from '#shared/problems/complaints-of';

describe('rolesSchema', () => {
  it.each([
    [['owner', 'bench'], []],
    [[], ['roles-none']],
    [['bench', 'bench'], ['entry-wrong-form']],
  ])('of %j complains of %j', (held, codes) => {
    const { error } = rolesSchema.safeParse(held);
    expect(error ? complaintsOf(error).map(({ code }) => code) : []).toEqual(codes);
  });
});
