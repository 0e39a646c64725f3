import { unkeepableTexts } from './unkeepable-texts';

test('minus nought is read as nought wherever it stands', () => {
  const body = JSON.parse('{"place":-0,"rows":[-0,{"size_mm":-0,"off":-1}],"text":"-0"}') as object;
  expect(unkeepableTexts(body)).toEqual([]);
  // toEqual tells 0 from -0.
  expect(body).toEqual({ place: 0, rows: [0, { size_mm: 0, off: -1 }], text: '-0' });
});

test('texts and names with half a pair of surrogates are complained of, a hundred at most', () => {
  const body = { name: 'a\ud800', inner: [{ '\udc00': 1 }, '😀'] };
  expect(unkeepableTexts(body).map(({ path }) => path.join('.'))).toEqual(['inner.0.\udc00', 'name']);
  expect(unkeepableTexts({ rows: Array.from({ length: 500 }, () => '\ud800') })).toHaveLength(100);
});

test.each([undefined, null, 'text', 7, Buffer.from('{}')])('%j holds nothing to complain of', (body) => {
  expect(unkeepableTexts(body)).toEqual([]);
});
