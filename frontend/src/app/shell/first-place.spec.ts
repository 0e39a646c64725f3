import { ChangeDetectionStrategy, Component } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { Router, provideRouter } from '@angular/router';
import { RouterTestingHarness } from '@angular/router/testing';
import type { Role } from '#shared/actor/role';
import { signIn } from '../../test/sign-in';
import { firstPlace } from './first-place';

@Component({ selector: 'app-test-page', changeDetection: ChangeDetectionStrategy.OnPush, template: '' })
class TestPage {}

const page = (path: string) => ({ path, component: TestPage });

describe('firstPlace', () => {
  it.each<[Role[], string]>([
    [['bench'], '/bench'],
    [['estimator'], '/jobs'],
    [['office'], '/jobs'],
    [['owner', 'bench'], '/bench'],
  ])('sends %s to %s', async (roles, address) => {
    const children = [
      { path: '', pathMatch: 'full' as const, redirectTo: firstPlace },
      page('bench'),
      page('jobs'),
      page('people'),
    ];
    TestBed.configureTestingModule({ providers: [provideRouter([{ path: '', children }])] });
    signIn(roles);
    await RouterTestingHarness.create('/');
    expect(TestBed.inject(Router).url).toBe(address);
  });

  it('never leads to a place that has no pages yet', async () => {
    TestBed.configureTestingModule({
      providers: [provideRouter([{ path: '', pathMatch: 'full', redirectTo: firstPlace }, page('people')])],
    });
    signIn(['estimator']);
    await RouterTestingHarness.create('/');
    expect(TestBed.inject(Router).url).toBe('/people');
  });
});
