import type { HttpErrorResponse } from '@angular/common/http';
import { HttpClient, provideHttpClient, withInterceptors } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { firstValueFrom } from 'rxjs';
import { answeredAhead } from './answered-ahead';
import { askedAhead } from './asked-ahead';

const address = '/api/client/overview';
const arrived = (body: unknown, status = 200, headers: Readonly<Record<string, string>> = {}) => ({
  ...{ ok: status < 400, status, url: address, headers, body },
});

describe('answeredAhead', () => {
  let answerTo: jest.SpiedFunction<typeof askedAhead.answerTo>;
  let http: HttpClient;
  let server: HttpTestingController;
  beforeEach(() => {
    answerTo = jest.spyOn(askedAhead, 'answerTo');
    const providers = [provideHttpClient(withInterceptors([answeredAhead])), provideHttpClientTesting()];
    TestBed.configureTestingModule({ providers });
    [http, server] = [TestBed.inject(HttpClient), TestBed.inject(HttpTestingController)];
  });
  afterEach(() => answerTo.mockRestore());
  const settled = () => new Promise((resolve) => setTimeout(resolve));

  it('takes what was asked ahead, and sends nothing', async () => {
    answerTo.mockReturnValue(Promise.resolve(arrived({ jobs: [] })));
    await expect(firstValueFrom(http.get(address))).resolves.toEqual({ jobs: [] });
    expect(answerTo).toHaveBeenLastCalledWith('GET', address);
    server.expectNone(address);
  });

  it('hands a refusal on as one, with when to ask again', async () => {
    const refusal = { title: 'Too many.' };
    answerTo.mockReturnValue(Promise.resolve(arrived(refusal, 429, { 'retry-after': '7' })));
    const error = (await firstValueFrom(http.get(address)).catch((caught: unknown) => caught)) as HttpErrorResponse;
    expect([error.status, error.error, error.headers.get('retry-after')]).toEqual([429, refusal, '7']);
    server.expectNone(address);
  });

  it('asks again where the answer did not come', async () => {
    answerTo.mockReturnValue(Promise.reject(new TypeError('offline')));
    const answer = firstValueFrom(http.get(address));
    await settled();
    server.expectOne(address).flush({ jobs: [] });
    await expect(answer).resolves.toEqual({ jobs: [] });
  });

  it('lets through what nobody asked', async () => {
    answerTo.mockReturnValue(undefined);
    const answer = firstValueFrom(http.get(address));
    server.expectOne(address).flush([]);
    await expect(answer).resolves.toEqual([]);
  });
});
