import {
  HttpErrorResponse,
  type HttpEvent,
  HttpHeaders,
  type HttpInterceptorFn,
  HttpResponse,
} from '@angular/common/http';
import { type Observable, catchError, from, of, switchMap, throwError } from 'rxjs';
import { askedAhead } from './asked-ahead';

/** An answer as a call awaits it. */
async function answered(answer: Promise<Response>): Promise<HttpResponse<unknown> | HttpErrorResponse> {
  const { ok, status, url, headers, ...response } = await answer.then(withBody);
  const heard = { status, url, headers: new HttpHeaders(Object.fromEntries(headers)) };
  return ok
    ? new HttpResponse({ ...heard, body: response.body })
    : new HttpErrorResponse({ ...heard, error: response.body });
}

async function withBody(answer: Response) {
  const { ok, status, url, headers } = answer;
  return { ok, status, url, headers, body: (await answer.json()) as unknown };
}

/** Takes answers that were asked for ahead; where one did not come, the call is sent as any other. */
export const answeredAhead: HttpInterceptorFn = (request, next): Observable<HttpEvent<unknown>> => {
  const answer = askedAhead.answerTo(request.method, request.urlWithParams);
  if (!answer) return next(request);
  return from(answered(answer)).pipe(
    catchError(() => of(undefined)),
    switchMap((heard) => {
      if (!heard) return next(request);
      return heard instanceof HttpResponse ? of(heard) : throwError(() => heard);
    }),
  );
};
