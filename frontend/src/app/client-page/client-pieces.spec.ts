import { clientId, clientIssue, clientPrice, ClientVisit, offered } from '../../test/client-issue';

const names = (visit: ClientVisit) =>
  [...visit.element.querySelectorAll('app-client-pieces strong')].map(({ textContent }) => textContent);

const manyMembers = () => {
  const issue = clientIssue();
  const [piece] = issue.pieces;
  const [frieze] = piece?.members ?? [];
  if (!piece || !frieze) throw new Error('the sample lost its members');
  const member = (number: number, more: object = {}) => ({
    ...frieze,
    ...{ id: clientId(80 + number), name: `Rail ${number}`, ...more },
  });
  return { issue, piece, member };
};

describe('The piece on a client’s page', () => {
  it('is drawn to scale member by member, with what each is made of', async () => {
    const visit = await ClientVisit.begin();
    expect(visit.element.querySelectorAll('app-client-pieces svg').length).toBeGreaterThanOrEqual(2);
    const [made, finish] = [...visit.element.querySelectorAll('app-client-pieces article .muted')]
      .filter(({ tagName }) => tagName === 'P')
      .map(({ textContent }) => textContent);
    expect([made, finish]).toEqual(['lime, Egg and dart', 'burnished gold']);
  });

  it('shows the first three members, and the others once they are asked for', async () => {
    const { issue, piece, member } = manyMembers();
    const visit = await ClientVisit.begin({
      ...issue,
      pieces: [{ ...piece, members: [1, 2, 3, 4, 5].map((n) => member(n)) }],
    });
    expect(names(visit)).toEqual(['Rail 1', 'Rail 2', 'Rail 3']);
    await visit.press('Show 2 more members');
    expect(names(visit)).toEqual(['Rail 1', 'Rail 2', 'Rail 3', 'Rail 4', 'Rail 5']);
  });

  it('follows the choice: what is taken away goes, what is brought comes', async () => {
    const { issue, piece, member } = manyMembers();
    const members = [member(1), member(2, { alternativeId: offered.crate })];
    const [oil, silver, crate, sample] = issue.alternatives;
    if (!oil || !silver || !crate || !sample) throw new Error('the sample lost its alternatives');
    const alternatives = [oil, silver, { ...crate, replaces: [clientId(81)] }, sample];
    const visit = await ClientVisit.begin({ ...issue, alternatives, pieces: [{ ...piece, members }] });
    expect(names(visit)).toEqual(['Rail 1']);
    await visit.choose('A crate');
    visit.asked('prices').flush(clientPrice(6_371_40, { choice: [offered.crate] }));
    await visit.settle();
    expect(names(visit)).toEqual(['Rail 2']);
  });
});
