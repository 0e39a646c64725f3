import { complaintsOf } from '#shared/problems/complaints-of';
import { clientContentSchema } from '#shared/jobs/client-schema';

const client = {
  ...{ name: 'Ashworth', kind: 'firm', contact: '', email: '', telephone: '', address: '' },
  ...{ website: '', taxRegistration: '', note: '' },
};

function complaints(entry: object): string[] {
  const read = clientContentSchema.safeParse({ ...client, ...entry });
  return read.success ? [] : complaintsOf(read.error).map(({ path, code }) => `${path.join('.')}: ${code}`);
}

describe('What is entered of a client', () => {
  it.each([
    ['may leave everything empty but the name', {}, []],
    ['needs a name', { name: '  ' }, ['name: entry-missing']],
    ['names an e-mail address as such', { email: 'desk at ashworth' }, ['email: entry-not-email']],
    ['names a web address that begins as one', { website: 'www.ashworth.example' }, ['website: entry-not-link']],
    ['never links to a script', { website: 'javascript:alert(1)' }, ['website: entry-not-link']],
    ['may link', { website: 'https://ashworth.example/gilding?year=2026' }, []],
    ['has an address of several lines', { address: 'Mill Yard\nLeeds' }, []],
    ['has a name of one line', { name: 'Ashworth\nLeeds' }, ['name: entry-wrong-form']],
    ['is one of three kinds', { kind: 'ghost' }, ['kind: entry-not-offered']],
    ['knows no other entries', { jobs: 3 }, ['jobs: entry-unknown']],
  ])('%s', (_sentence, entry, expected) => {
    expect(complaints(entry)).toEqual(expected);
  });

  it('keeps an e-mail address in small letters', () => {
    expect(clientContentSchema.parse({ ...client, email: ' Desk@Ashworth.example ' }).email).toBe(
      'desk@ashworth.example',
    );
  });
});
