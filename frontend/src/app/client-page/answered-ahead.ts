import {
  HttpErrorResponse,
  type HttpEvent,
  HttpHeaders,
  type HttpInterceptorFn,
  HttpResponse,
} from '@angular/common/http';
import { type Observable, catchError, from, of, switchMap, throwError } from 'rxjs';
import { nextTask } from '../core/next-task';
import { type Answer, askedAhead } from './asked-ahead';

/** An answer as a call awaits it; what follows from it begins in a task of its own, since answers kept ready would join into one long one. */
async function answered({ ok, body, ...answer }: Answer): Promise<HttpResponse<unknown> | HttpErrorResponse> {
  await nextTask();
  const heard = { ...answer, headers: new HttpHeaders(answer.headers) };
  return ok ? new HttpResponse({ ...heard, body }) : new HttpErrorResponse({ ...heard, error: body });
}

/** Takes answers that were asked for ahead; where one did not come, the call is sent as any other. */
export const answeredAhead: HttpInterceptorFn = (request, next): Observable<HttpEvent<unknown>> => {
  const answer = askedAhead.answerTo(request.method, request.urlWithParams);
  if (!answer) return next(request);
  return from(answer.then(answered)).pipe(
    catchError(() => of(undefined)),
    switchMap((heard) => {
      if (!heard) return next(request);
      return heard instanceof HttpResponse ? of(heard) : throwError(() => heard);
    }),
  );
};
