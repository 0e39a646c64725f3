import * as z from 'zod';
import { complaintsOf, readBy } from '#shared/problems/complaints-of';
import { emailAddress } from '#shared/problems/entry-schema';

describe('An entry', () => {
  const entries = z.strictObject({
    name: z.string(),
    count: z.int(),
    way: z.enum(['share', 'run']),
    email: emailAddress,
  });
  const codes = (value: object) =>
    Object.fromEntries(
      complaintsOf(readBy(entries, value).error as z.ZodError).map(({ path, code }) => [path.join('.'), code]),
    );

  it.each([
    ['left out', {}],
    ['empty', { name: null, count: null, way: '', email: '' }],
  ])('that is %s is missing, whatever it should have been', (_, value) => {
    const missing = 'entry-missing';
    expect(codes(value)).toEqual({ name: missing, count: missing, way: missing, email: missing });
  });

  it('of another kind is not missing', () => {
    expect(codes({ name: 7, count: '7', way: 7, email: 'desk at ashworth' })).toEqual({
      name: 'entry-wrong-kind',
      count: 'entry-wrong-kind',
      way: 'entry-not-offered',
      email: 'entry-not-email',
    });
  });
});
