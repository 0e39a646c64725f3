import { type Signal, computed, signal } from '@angular/core';
import { takeUntilDestroyed, toObservable, toSignal } from '@angular/core/rxjs-interop';
import { type Observable, Subject, catchError, exhaustMap, map, merge, of, startWith, switchMap, timer } from 'rxjs';
import { abortable } from '../api/abortable';

/** One page of a list, as `page-schema.ts` has it. */
export interface ListPage<T> {
  readonly items: readonly T[];
  readonly next: string | null;
  readonly count: number;
  readonly countIsExact: boolean;
}

/** Fetches a page: the first, or the one where another ended. */
export type PageFetch<Q, T> = (query: Q, cursor: string | undefined, signal: AbortSignal) => Promise<ListPage<T>>;

interface Known<T> extends ListPage<T> {
  readonly problem: string;
  readonly isFetching: boolean;
  /** A first page has come. */
  readonly isThere: boolean;
}

const skeletonAfter_ms = 300;
const nothing = { items: [], next: null, count: 0, countIsExact: true, problem: '', isThere: false } as const;
const messageOf = (error: unknown): string => (error instanceof Error ? error.message : String(error));

/**
 * A list that grows page by page. Another query begins it anew, and whatever was still under way is dropped; what is there stays to
 * be seen until then. Make it where `inject` may be called.
 */
export class PagedList<Q, T> {
  private readonly known = signal<Known<T>>({ ...nothing, isFetching: true });
  private readonly again = new Subject<void>();
  private readonly further = new Subject<void>();

  readonly items = computed(() => this.known().items);
  readonly count = computed(() => this.known().count);
  readonly countIsExact = computed(() => this.known().countIsExact);
  readonly problem = computed(() => this.known().problem);
  readonly hasMore = computed(() => this.known().next !== null);
  readonly isFetching = computed(() => this.known().isFetching);
  readonly isEmpty = computed(() => this.known().isThere && this.known().items.length === 0);
  /** Nothing is there to be seen yet, and it takes long enough to say so. */
  readonly isAwaited: Signal<boolean>;

  constructor(
    query: Signal<Q>,
    private readonly fetch: PageFetch<Q, T>,
  ) {
    merge(toObservable(query), this.again.pipe(map(() => query())))
      .pipe(
        switchMap((asked) => this.pagesOf(asked)),
        takeUntilDestroyed(),
      )
      .subscribe((change) => this.known.update((known) => ({ ...known, ...change })));
    const isSlow = toObservable(this.isFetching).pipe(
      switchMap((isFetching) => (isFetching ? timer(skeletonAfter_ms).pipe(map(() => true)) : of(false))),
    );
    const slow = toSignal(isSlow, { initialValue: false });
    this.isAwaited = computed(() => slow() && !this.known().isThere);
  }

  /** Fetches the page after the last. */
  more(): void {
    this.further.next();
  }

  /** Begins anew with the same query. */
  reload(): void {
    this.again.next();
  }

  private pagesOf(asked: Q): Observable<Partial<Known<T>>> {
    let isFirst = true;
    const page = () => {
      const begin = isFirst;
      const cursor = begin ? undefined : (this.known().next ?? undefined);
      return abortable((abort) => this.fetch(asked, cursor, abort)).pipe(
        map(({ items, ...rest }): Partial<Known<T>> => {
          isFirst = false;
          const all = begin ? items : [...this.known().items, ...items];
          return { ...rest, items: all, isThere: true, isFetching: false };
        }),
        catchError((error: unknown) => of({ problem: messageOf(error), isFetching: false })),
        startWith({ problem: '', isFetching: true }),
      );
    };
    return this.further.pipe(startWith(undefined), exhaustMap(page));
  }
}
