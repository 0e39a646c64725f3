import { choiceComplaints } from '#shared/agreements/choice-complaints';

const offered = [
  { id: 'oil', group: 'Feet' },
  { id: 'silver', group: 'Feet' },
  { id: 'plain', group: 'Frieze' },
  { id: 'crate', group: '' },
  { id: 'pedestal', group: '' },
];

describe('A choice among alternatives', () => {
  it.each([
    ['nothing, which is the base', [], []],
    ['one of each group', ['silver', 'plain'], []],
    ['everything that may be ticked', ['crate', 'pedestal', 'oil'], []],
    ['two of one group', ['oil', 'plain', 'silver'], [['choice', 2, 'choice-one-of-group']]],
    ['the same twice', ['crate', 'crate'], [['choice', 1, 'entry-twice']]],
    ['something not offered', ['oil', 'marble'], [['choice', 1, 'entry-not-offered']]],
  ])('of %s', (_, choice, expected) => {
    expect(choiceComplaints(choice, offered).map(({ path, code }) => [...path, code])).toEqual(expected);
  });
});
