import { canonicalJson } from '#shared/estimates/canonical-json';

describe('Canonical JSON', () => {
  it('is the same text for the same content, in whatever order it was put together', () => {
    expect(canonicalJson({ b: 1, a: { d: [2, 1], c: null } })).toBe(canonicalJson({ a: { c: null, d: [2, 1] }, b: 1 }));
    expect(canonicalJson({ b: 1, a: { d: [2, 1], c: null } })).toBe('{"a":{"c":null,"d":[2,1]},"b":1}');
  });

  it('keeps the order of a list and leaves out what is undefined', () => {
    expect(canonicalJson([{ z: undefined, y: 'second' }, 'first'])).toBe('[{"y":"second"},"first"]');
  });

  it('is other text for other content', () => {
    expect(canonicalJson({ a: 1 })).not.toBe(canonicalJson({ a: '1' }));
    expect(canonicalJson({ a: null })).not.toBe(canonicalJson({}));
  });
});
