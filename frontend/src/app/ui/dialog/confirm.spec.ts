import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { ChangeDetectionStrategy, Component } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { MatDialogHarness } from '@angular/material/dialog/testing';
import { MatButtonHarness } from '@angular/material/button/testing';
import { Saving } from '../../core/saving/saving';
import { Confirm } from './confirm';
import { leaveGuard } from './leave-guard';

@Component({ selector: 'app-test-page', changeDetection: ChangeDetectionStrategy.OnPush, template: '' })
class TestPage {}

const question = { heading: 'Remove the member?', text: 'Its zones go with it.', yes: 'Remove it' };

describe('Confirm', () => {
  const dialog = () => TestbedHarnessEnvironment.documentRootLoader(TestBed.createComponent(TestPage));
  const press = async (text: string) => {
    const opened = await dialog().getHarness(MatDialogHarness);
    await (await opened.getHarness(MatButtonHarness.with({ text }))).click();
  };

  it('is yes only when somebody presses what does it', async () => {
    const yes = TestBed.inject(Confirm).ask(question);
    await press('Remove it');
    await expect(yes).resolves.toBe(true);
    const no = TestBed.inject(Confirm).ask(question);
    await press('Leave it as it is');
    await expect(no).resolves.toBe(false);
  });

  it('stands before leaving a page only while something is unsent', async () => {
    const leave = () =>
      TestBed.runInInjectionContext(() => leaveGuard(undefined, {} as never, {} as never, {} as never));
    expect(leave()).toBe(true);
    TestBed.inject(Saving).expect(1);
    const answer = leave();
    await press('Leave it as it is');
    await expect(answer).resolves.toBe(false);
  });
});
