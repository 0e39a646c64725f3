import { ChangeDetectionStrategy, Component, type Type } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { FormControl, ReactiveFormsModule } from '@angular/forms';
import { signIn, words } from '../../../test/sign-in';
import { AreaField } from './area-field';
import { MillimetreField } from './millimetre-field';

@Component({
  selector: 'app-test-millimetres',
  imports: [MillimetreField, ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-millimetre-field
      i18n-label
      label="Run"
      typedText="2 3/8"
      [formControl]="control"
      (typedAs)="texts.push($event)"
    />
  `,
})
class TestMillimetres {
  readonly texts: string[] = [];
  readonly control = new FormControl<number | null>(null);
}

@Component({
  selector: 'app-test-area',
  imports: [AreaField, ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `<app-area-field i18n-label label="Ground" [formControl]="control" />`,
})
class TestArea {
  readonly texts: string[] = [];
  readonly control = new FormControl<number | null>(null);
}

describe('Fields that hold plain figures', () => {
  beforeEach(() => TestBed.configureTestingModule({ providers: [words] }));

  async function open(component: Type<TestMillimetres | TestArea>) {
    const fixture = TestBed.createComponent(component);
    await fixture.whenStable();
    const entry = (fixture.nativeElement as HTMLElement).querySelector('input') as HTMLInputElement;
    const type = (text: string) => {
      entry.value = text;
      entry.dispatchEvent(new Event('input'));
      return fixture.whenStable();
    };
    const put = (value: number) => {
      fixture.componentInstance.control.setValue(value);
      return fixture.whenStable();
    };
    return { entry, type, put, page: fixture.componentInstance };
  }

  it('give millimetres, and tell the text before the length', async () => {
    signIn(['owner'], { lengthUnit: 'in' });
    const { type, page } = await open(TestMillimetres);
    await type('1 1/2');
    // The inch is 25.4 mm exactly (International Yard and Pound Agreement of 1959).
    expect([page.control.value, page.texts]).toEqual([38.1, ['1 1/2']]);
  });

  it('show the text as it was typed while it says this length, else the length', async () => {
    signIn(['owner'], { lengthUnit: 'in' });
    const { entry, put } = await open(TestMillimetres);
    await put(60.325);
    expect(entry.value).toBe('2 3/8');
    await put(25.4);
    expect(entry.value).toBe('1');
  });

  it('give what no schema takes where nothing can be read', async () => {
    signIn();
    const { type, page } = await open(TestMillimetres);
    await type('long');
    expect(page.control.value).toBeNaN();
  });

  it.each([
    ['mm', 1250, '12.5', 'cm²'],
    ['in', 645.16, '1', 'in²'],
  ] as const)('hold square millimetres, typed per %s', async (lengthUnit, area_mm2, text, unit) => {
    signIn(['owner'], { lengthUnit });
    const { entry, type, put, page } = await open(TestArea);
    await put(area_mm2);
    expect([entry.value, entry.closest('.line')?.textContent]).toEqual([text, expect.stringContaining(unit)]);
    await type('2');
    expect(page.control.value).toBeCloseTo((area_mm2 / Number(text)) * 2, 6);
  });
});
