import { ChangeDetectionStrategy, Component, type Type } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { FormControl, ReactiveFormsModule } from '@angular/forms';
import { signIn, words } from '../../../test/sign-in';
import { DecimalField } from './decimal-field';
import { LengthField } from './length-field';
import { NumberField } from './number-field';
import { PercentField } from './percent-field';
import { TemperatureField } from './temperature-field';

@Component({
  selector: 'app-test-length',
  imports: [LengthField, ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `<app-length-field i18n-label label="Run" [formControl]="control" />`,
})
class TestLength {
  readonly control = new FormControl<{ text: string; mm: number } | null>(null);
}

@Component({
  selector: 'app-test-number',
  imports: [NumberField, ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `<app-number-field i18n-label label="Pieces" [complaint]="complaint" [formControl]="control" />`,
})
class TestNumber {
  readonly complaint = 'Whole numbers only.';
  readonly control = new FormControl<number | null>(null);
}

@Component({
  selector: 'app-test-percent',
  imports: [PercentField, ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `<app-percent-field i18n-label label="Share" [formControl]="control" />`,
})
class TestPercent {
  readonly control = new FormControl<number | null>(null);
}

@Component({
  selector: 'app-test-decimal',
  imports: [DecimalField, ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `<app-decimal-field i18n-label label="Rate" [formControl]="control" />`,
})
class TestDecimal {
  readonly control = new FormControl<string | null>('');
}

@Component({
  selector: 'app-test-temperature',
  imports: [TemperatureField, ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `<app-temperature-field i18n-label label="Air" [formControl]="control" />`,
})
class TestTemperature {
  readonly control = new FormControl<number | null>(null);
}

describe('The fields for figures', () => {
  beforeEach(() => TestBed.configureTestingModule({ providers: [words] }));

  async function open<T extends { readonly control: FormControl }>(component: Type<T>) {
    const fixture = TestBed.createComponent(component);
    await fixture.whenStable();
    const element = fixture.nativeElement as HTMLElement;
    const entry = element.querySelector('input')!;
    const control = fixture.componentInstance.control as T['control'];
    const type = async (text: string) => {
      entry.value = text;
      entry.dispatchEvent(new Event('input'));
      await fixture.whenStable();
    };
    const complaint = () => element.querySelector('[role=alert]')?.textContent ?? '';
    return { fixture, element, entry, control, type, complaint };
  }

  it('keep the text of a length as it was typed, beside its millimetres and the other unit', async () => {
    signIn(['owner'], { lengthUnit: 'in' });
    const { control, type, element, entry } = await open(TestLength);
    await type('2\' 9 7/8"');
    expect(control.value).toEqual({ text: '2\' 9 7/8"', mm: 860.425 });
    expect(entry.value).toBe('2\' 9 7/8"');
    expect(element.querySelector('.reading')?.textContent).toBe('≈ 860.4 mm');
  });

  it('show a kept length as it was typed', async () => {
    signIn();
    const { control, entry, fixture } = await open(TestLength);
    control.setValue({ text: '86 cm', mm: 860 });
    await fixture.whenStable();
    expect(entry.value).toBe('86 cm');
  });

  it('give the form something no schema takes while a text cannot be read, and say why', async () => {
    signIn();
    const { control, type, complaint } = await open(TestNumber);
    await type('1,234');
    expect(control.value).toBeNaN();
    expect(complaint()).toBe('Please leave out thousands separators; “.” is the decimal sign.');
    await type('3.5');
    expect(control.value).toBe(3.5);
    expect(complaint()).toBe('Whole numbers only.');
  });

  it('read numbers with the decimal sign of the workshop', async () => {
    signIn(['owner'], { locale: 'de-DE' });
    const { control, type, entry, fixture } = await open(TestNumber);
    await type('3,5');
    expect(control.value).toBe(3.5);
    control.setValue(1234.25);
    await fixture.whenStable();
    expect(entry.value).toBe('1234,25');
  });

  it('tell an empty entry from an unreadable one', async () => {
    signIn();
    const { control, type } = await open(TestNumber);
    await type('7');
    await type('');
    expect(control.value).toBeNull();
  });

  it('take a percentage with its sign or without', async () => {
    signIn();
    const { control, type } = await open(TestPercent);
    await type('17.5 %');
    expect(control.value).toBe(17.5);
    await type('20');
    expect(control.value).toBe(20);
  });

  it('keep a decimal exact, as text', async () => {
    signIn(['owner'], { locale: 'de-DE' });
    const { control, type, entry, element, fixture } = await open(TestDecimal);
    await type('0,1');
    expect(control.value).toBe('0.1');
    await type('1.5');
    expect(control.value).toMatch(/^\?/);
    control.setValue('2310.70');
    await fixture.whenStable();
    expect([entry.value, element.textContent?.includes('€')]).toEqual(['2310,70', true]);
  });

  it('take a temperature in the degrees of the workshop and keep it in °C', async () => {
    signIn(['owner'], { locale: 'en-US', lengthUnit: 'in' });
    const { control, type, entry, element, fixture } = await open(TestTemperature);
    await type('68');
    expect(control.value).toBe(20);
    await type('warm');
    expect(control.value).toBeNaN();
    control.setValue(10);
    await fixture.whenStable();
    expect([entry.value, element.textContent?.includes('°F')]).toEqual(['50', true]);
  });

  it('take a temperature in °C where nobody knows another', async () => {
    signIn();
    const { control, type, element } = await open(TestTemperature);
    await type('18.5');
    expect([control.value, element.textContent?.includes('°C')]).toEqual([18.5, true]);
  });

  it('tie the entry to its label and to what is wrong with it', async () => {
    signIn();
    const { element, entry } = await open(TestNumber);
    expect(element.querySelector('label')?.htmlFor).toBe(entry.id);
    expect(element.querySelector(`#${entry.getAttribute('aria-describedby')}`)?.textContent).toBe(
      'Whole numbers only.',
    );
    expect(entry.getAttribute('aria-invalid')).toBe('true');
  });
});
