import { Observable } from 'rxjs';

/** A call as an observable: whoever no longer listens ends it. */
export const abortable = <T>(call: (signal: AbortSignal) => Promise<T>): Observable<T> =>
  new Observable<T>((subscriber) => {
    const abort = new AbortController();
    call(abort.signal).then(
      (answer) => {
        subscriber.next(answer);
        subscriber.complete();
      },
      (error: unknown) => subscriber.error(error),
    );
    return () => abort.abort();
  });
