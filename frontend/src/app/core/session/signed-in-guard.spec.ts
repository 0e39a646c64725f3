import { ChangeDetectionStrategy, Component } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { Router, provideRouter } from '@angular/router';
import { RouterTestingHarness } from '@angular/router/testing';
import { factsOf, signIn } from '../../../test/sign-in';
import { roleGuard } from './role-guard';
import { Session } from './session';
import { signedInGuard } from './signed-in-guard';

@Component({ selector: 'app-test-page', changeDetection: ChangeDetectionStrategy.OnPush, template: '' })
class TestPage {}

describe('The guards', () => {
  let harness: RouterTestingHarness;

  beforeEach(async () => {
    TestBed.configureTestingModule({
      providers: [
        provideRouter([
          { path: 'sign-in', component: TestPage },
          { path: 'choose-workshop', component: TestPage },
          {
            path: '',
            canMatch: [signedInGuard],
            children: [
              { path: 'jobs', component: TestPage },
              { path: 'rates', canMatch: [roleGuard('owner', 'estimator')], component: TestPage },
              { path: '**', title: 'Nothing here', component: TestPage },
            ],
          },
        ]),
      ],
    });
    harness = await RouterTestingHarness.create();
  });

  const reach = async (address: string): Promise<string> => {
    await harness.navigateByUrl(address);
    return TestBed.inject(Router).url;
  };

  it('send a stranger to sign in, and remember where they were going', async () => {
    await expect(reach('/jobs?search=heron')).resolves.toBe('/sign-in?next=%2Fjobs%3Fsearch%3Dheron');
  });

  it('ask somebody without a workshop to choose one', async () => {
    const { membership: _membership, workshop: _workshop, ...nowhere } = factsOf(['owner']);
    TestBed.inject(Session).put(nowhere, '');
    await expect(reach('/jobs')).resolves.toBe('/choose-workshop');
  });

  it('let in whoever holds one of the roles', async () => {
    signIn(['bench', 'estimator']);
    await expect(reach('/rates')).resolves.toBe('/rates');
    expect(TestBed.inject(Router).routerState.snapshot.root.firstChild?.firstChild?.title).toBeUndefined();
  });

  it('hide what is not for a role as if it were not there', async () => {
    signIn(['bench']);
    await reach('/rates');
    expect(TestBed.inject(Router).routerState.snapshot.root.firstChild?.firstChild?.title).toBe('Nothing here');
  });
});
