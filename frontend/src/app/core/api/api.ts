import { HttpClient, HttpResponse } from '@angular/common/http';
import { Injectable, Injector, inject } from '@angular/core';
import { type Observable, filter, firstValueFrom, fromEvent, take, takeUntil } from 'rxjs';
import type * as z from 'zod';
import type { BareEndpoint, Endpoint } from '#shared/actor/endpoint';
import { audiences } from '#shared/actor/role';
import { ProblemError } from '../problems/problem-error';
import { Session } from '../session/session';
import { SESSION_PORT } from '../session/session-port';
import type { AnyParts, CallAnswer, CallParts } from './call-parts';
import { callRequest } from './call-request';
import { problemOf } from './problem-of';

/** Calls the server's endpoints; what goes out and what comes back are typed by the endpoint itself, and parsed by it where it has its schemas. */
@Injectable({ providedIn: 'root' })
export class Api {
  private readonly http = inject(HttpClient);
  private readonly session = inject(Session);
  private readonly injector = inject(Injector);
  private signingIn: Promise<boolean> | undefined;

  /** The parsed answer, or a `ProblemError`. A session that has ended is begun again over the page, and the call sent once more. */
  async call<const E extends Endpoint>(endpoint: E | BareEndpoint<E>, parts: CallParts<E>): Promise<CallAnswer<E>> {
    try {
      return await this.send(endpoint, parts);
    } catch (error) {
      if (!(await this.isAdmittedAgain(endpoint, error))) throw error;
      return this.send(endpoint, parts);
    }
  }

  private async send<E extends Endpoint>(endpoint: E | BareEndpoint<E>, parts: AnyParts): Promise<CallAnswer<E>> {
    parts.signal?.throwIfAborted();
    const response = await firstValueFrom(this.responses(endpoint, parts)).catch(async (error: unknown) => {
      parts.signal?.throwIfAborted();
      throw await problemOf(error);
    });
    return (endpoint.media ? response.body : this.parsed(endpoint, response.body)) as CallAnswer<E>;
  }

  private responses(endpoint: BareEndpoint, parts: AnyParts): Observable<HttpResponse<unknown>> {
    const responses = this.http
      .request(callRequest(endpoint, parts, this.session.requestToken()))
      .pipe(filter((event): event is HttpResponse<unknown> => event instanceof HttpResponse));
    return parts.signal ? responses.pipe(takeUntil(fromEvent(parts.signal, 'abort').pipe(take(1)))) : responses;
  }

  /** Parsed by the schema of the widest audience the endpoint answers and the person belongs to, as the server chose it. */
  private parsed(endpoint: Endpoint | BareEndpoint, answer: unknown): unknown {
    if (!('answers' in endpoint)) return answer;
    const audience = audiences.slice(audiences.indexOf(this.session.audience())).find((one) => endpoint.answers[one]);
    const schema: z.ZodType | undefined = audience && endpoint.answers[audience];
    return schema?.parse(answer);
  }

  private async isAdmittedAgain(endpoint: BareEndpoint, error: unknown): Promise<boolean> {
    if (!(error instanceof ProblemError) || !error.isOfSession) return false;
    const port = this.injector.get(SESSION_PORT);
    if (endpoint.callers === 'anyone' || endpoint.callers === 'client' || !this.session.isSignedIn()) {
      if (error.status === 401) return false;
      await port.read();
      return true;
    }
    this.signingIn ??= port.signInAgain().finally(() => (this.signingIn = undefined));
    return this.signingIn;
  }
}
