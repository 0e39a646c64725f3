import { issueStanding } from '#shared/agreements/issue-standing';

describe('Where an issue stands for its client', () => {
  it.each([
    ['issued', '2027-03-01', 'open'],
    ['sent', '2027-03-31', 'open'],
    ['sent', '2027-04-01', 'past-validity'],
    ['accepted', '2027-04-01', 'accepted'],
    ['declined', '2027-04-01', 'declined'],
    ['replaced', '2027-03-01', 'replaced'],
  ] as const)('%s, valid until 31 March, on %s: %s', (state, today, expected) => {
    expect(issueStanding({ state, validUntil: '2027-03-31' }, today)).toBe(expected);
  });
});
