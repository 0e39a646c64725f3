import { ChangeDetectionStrategy, Component } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { Router, provideRouter } from '@angular/router';
import { RouterTestingHarness } from '@angular/router/testing';
import { signIn } from '../../test/sign-in';
import { invoicesRoutes } from './invoices-routes';

@Component({ selector: 'app-test-page', changeDetection: ChangeDetectionStrategy.OnPush, template: '' })
class TestPage {}

it('Accounts send whoever keeps no books to their first place', async () => {
  const routes = [
    { path: '', pathMatch: 'full' as const, component: TestPage },
    { path: 'accounts', children: invoicesRoutes },
  ];
  TestBed.configureTestingModule({ providers: [provideRouter(routes)] });
  signIn(['estimator']);
  const harness = await RouterTestingHarness.create('/accounts');
  expect(TestBed.inject(Router).url).toBe('/');
  expect(harness.routeDebugElement?.componentInstance).toBeInstanceOf(TestPage);
});
