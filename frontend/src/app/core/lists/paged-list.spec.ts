import { signal } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { type ListPage, PagedList } from './paged-list';

interface Asked {
  readonly search: string;
  readonly cursor: string | undefined;
  readonly signal: AbortSignal;
  readonly answer: (page: Partial<ListPage<string>>) => Promise<void>;
  readonly fail: (message: string) => Promise<void>;
}

const settle = () => new Promise<void>((resolve) => setTimeout(resolve));

function open() {
  const search = signal('');
  const asked: Asked[] = [];
  const list = TestBed.runInInjectionContext(
    () =>
      new PagedList<string, string>(search, (query, cursor, abort) => {
        return new Promise((resolve, reject) => {
          asked.push({
            search: query,
            cursor,
            signal: abort,
            answer: (page) => (resolve({ items: [], next: null, count: 0, countIsExact: true, ...page }), settle()),
            fail: (message) => (reject(new Error(message)), settle()),
          });
        });
      }),
  );
  TestBed.tick();
  return { list, asked, search };
}

describe('A list of pages', () => {
  it('grows page by page, from where the last one ended', async () => {
    const { list, asked } = open();
    await asked[0].answer({ items: ['apron'], next: 'after apron', count: 2 });
    list.more();
    list.more();
    expect(asked.map(({ cursor }) => cursor)).toEqual([undefined, 'after apron']);
    await asked[1].answer({ items: ['leg'], next: null, count: 2 });
    expect([list.items(), list.hasMore(), list.count()]).toEqual([['apron', 'leg'], false, 2]);
  });

  it('begins anew with another query, and drops what was under way for the one before', async () => {
    const { list, asked, search } = open();
    search.set('leg');
    TestBed.tick();
    expect(asked.map((one) => [one.search, one.signal.aborted])).toEqual([
      ['', true],
      ['leg', false],
    ]);
    await asked[0].answer({ items: ['late'] });
    await asked[1].answer({ items: ['leg'] });
    expect(list.items()).toEqual(['leg']);
  });

  it('shows what is there until the new is', async () => {
    const { list, asked, search } = open();
    await asked[0].answer({ items: ['apron'] });
    search.set('leg');
    TestBed.tick();
    expect([list.items(), list.isFetching()]).toEqual([['apron'], true]);
    await asked[1].answer({});
    expect([list.items(), list.isEmpty()]).toEqual([[], true]);
  });

  it('says what went wrong, and asks again when told', async () => {
    const { list, asked } = open();
    await asked[0].fail('away');
    expect([list.problem(), list.isEmpty()]).toEqual(['away', false]);
    list.reload();
    await asked[1].answer({ items: ['apron'] });
    expect([list.problem(), list.items()]).toEqual(['', ['apron']]);
  });

  it('asks for the first page again where that is what failed', async () => {
    const { list, asked } = open();
    await asked[0].fail('away');
    list.more();
    expect(asked[1].cursor).toBeUndefined();
    await asked[1].answer({ items: ['apron'] });
    expect(list.items()).toEqual(['apron']);
  });

  it('is awaited only when it takes long', async () => {
    const { list, asked } = open();
    expect(list.isAwaited()).toBe(false);
    await new Promise((resolve) => setTimeout(resolve, 350));
    expect(list.isAwaited()).toBe(true);
    await asked[0].answer({ items: ['apron'] });
    TestBed.tick();
    expect(list.isAwaited()).toBe(false);
  });
});
