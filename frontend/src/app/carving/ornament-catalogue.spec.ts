import { startCarving } from '#shared/carving/start-carving';
import { catalogueGroups, foundEntries, ornamentCatalogue } from './ornament-catalogue';

const catalogue = ornamentCatalogue(startCarving);
const found = (text: string) => foundEntries(catalogue, text).map(({ name }) => name);

describe('The catalogue of ornaments', () => {
  it.each([
    ['the beginning of a name', 'egg', ['Egg and dart']],
    ['the beginning of any of its words', 'dart', ['Egg and dart']],
    ['beginnings of several words, in any order', 'claw ball', ['Ball and claw']],
    ['a whole name before those that only begin with it', 'jig', ['Jig']],
    ['nothing of the kind', 'gargoyle', []],
  ])('finds by %s', (_sentence, text, names) => {
    expect(found(text)).toEqual(names);
  });

  it('puts a name that begins so before one with such a word in it', () => {
    expect(found('leaf')).toEqual(['Leaf and tongue', 'Acanthus leaf']);
  });

  it('shows everything while nothing is typed, under its headings', () => {
    expect(found('')).toHaveLength(catalogue.length);
    const groups = catalogueGroups(catalogue);
    expect(groups.map(({ kind }) => kind)).toEqual(['repeat', 'piece', 'length', 'area', 'shaping', 'free', 'once']);
    expect(groups.flatMap(({ entries }) => entries)).toHaveLength(catalogue.length);
  });

  it('knows the relief of an ornament, and that an item has none', () => {
    const reliefs = Object.fromEntries(catalogue.map(({ id, relief }) => [id, relief]));
    expect([reliefs['lion-paw'], reliefs['clay-model']]).toEqual(['high', null]);
  });
});
