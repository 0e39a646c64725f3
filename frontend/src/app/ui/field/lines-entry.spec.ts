import { ChangeDetectionStrategy, Component } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { FormControl, ReactiveFormsModule } from '@angular/forms';
import { LinesEntry } from './lines-entry';

@Component({
  selector: 'app-test-address',
  imports: [LinesEntry, ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `<textarea appLines i18n-aria-label aria-label="Address" [formControl]="control"></textarea>`,
})
class TestAddress {
  readonly control = new FormControl<string[]>(['4 Mill Yard', 'Dublin 8']);
}

describe('LinesEntry', () => {
  it('shows a list as lines and reads lines as a list', async () => {
    const fixture = TestBed.createComponent(TestAddress);
    await fixture.whenStable();
    const entry = (fixture.nativeElement as HTMLElement).querySelector('textarea')!;
    expect(entry.value).toBe('4 Mill Yard\nDublin 8');
    entry.value = '5 Mill Yard \n\nDublin 8\n';
    entry.dispatchEvent(new Event('input'));
    expect(fixture.componentInstance.control.value).toEqual(['5 Mill Yard', 'Dublin 8']);
  });
});
