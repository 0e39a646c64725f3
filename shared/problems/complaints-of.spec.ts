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

describe('Complaints', () => {
  const many = Object.fromEntries(Array.from({ length: 200_000 }, (_, at) => [`key${at}`, 1]));

  it('are told up to a hundred, and one more says how many there are besides', () => {
    const read = readBy(z.strictObject({ name: z.string() }), many);
    const complaints = complaintsOf(read.error as z.ZodError);
    expect(complaints).toHaveLength(101);
    expect(complaints[1]).toEqual({ path: ['key0'], code: 'entry-unknown', values: {} });
    expect(complaints[100]).toEqual({ path: [], code: 'entries-more', values: { count: 199_901 } });
  });

  it('are all told to whoever asks for all', () => {
    const read = readBy(z.strictObject({}), many);
    expect(complaintsOf(read.error as z.ZodError, Infinity)).toHaveLength(200_000);
  });
});
