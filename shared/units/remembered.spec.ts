import { Remembered } from '#shared/units/remembered';

describe('What is remembered', () => {
  let made: string[] = [];
  const make = (text: string) => () => {
    made.push(text);
    return text;
  };
  beforeEach(() => {
    made = [];
  });

  it('is made once for a key', () => {
    const kept = new Remembered<string>(2);
    expect([kept.of('a', make('a')), kept.of('a', make('another')), made]).toEqual(['a', 'a', ['a']]);
  });

  it('gives way, what was asked for longest ago first', () => {
    const kept = new Remembered<string>(2);
    for (const key of ['a', 'b', 'a', 'c', 'a', 'b']) kept.of(key, make(key));
    expect(made).toEqual(['a', 'b', 'c', 'b']);
  });

  it('is made anew once it is forgotten, and nothing is kept of what could not be made', () => {
    const kept = new Remembered<string>(2);
    const fail = () =>
      kept.of('a', () => {
        throw new Error('not now');
      });
    expect(fail).toThrow('not now');
    kept.of('a', make('a'));
    kept.forget('a');
    kept.of('a', make('a again'));
    expect(made).toEqual(['a', 'a again']);
  });
});
