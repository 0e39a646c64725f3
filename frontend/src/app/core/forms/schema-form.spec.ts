import { ChangeDetectionStrategy, Component } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { ReactiveFormsModule } from '@angular/forms';
import * as z from 'zod';
import { complain } from '#shared/problems/complaints-of';
import { words } from '../../../test/sign-in';
import { ProblemError } from '../problems/problem-error';
import { schemaForm } from './schema-form';

const clientSchema = z.strictObject({
  name: z.string().trim().min(1),
  discount: z.number().min(0).max(100).optional(),
  address: z.strictObject({ city: z.string().min(2), lines: z.array(z.string().max(5)) }),
});

@Component({
  selector: 'app-test-form',
  changeDetection: ChangeDetectionStrategy.OnPush,
  imports: [ReactiveFormsModule],
  template: '',
})
class TestForm {
  readonly form = schemaForm(clientSchema, { name: '', discount: null, address: { city: '', lines: [] } });
}

const refused = (errors: { path: (string | number)[]; message: string }[], title = 'Some entries need another look.') =>
  new ProblemError({ type: 'x', title, status: 400, instance: '', errors });

describe('SchemaForm', () => {
  const make = () => {
    TestBed.configureTestingModule({ providers: [words] });
    return TestBed.createComponent(TestForm).componentInstance.form;
  };

  it('makes one control for each field, a group for an object within', () => {
    const { group } = make();
    expect(Object.keys(group.controls)).toEqual(['name', 'discount', 'address']);
    expect(Object.keys(group.controls.address.controls)).toEqual(['city', 'lines']);
  });

  it('parses what was entered, leaving an optional field absent while it is empty', () => {
    const form = make();
    expect(form.parsed()).toBeUndefined();
    form.group.setValue({ name: ' Holt ', discount: null, address: { city: 'Ghent', lines: [] } });
    expect(form.parsed()).toEqual({ name: 'Holt', address: { city: 'Ghent', lines: [] } });
    form.group.controls.discount.setValue(5);
    expect(form.parsed()?.discount).toBe(5);
  });

  it('says nothing about an entry until it was visited', () => {
    const form = make();
    expect(form.message('name')).toBe('');
    form.group.controls.name.markAsTouched();
    expect(form.message('name')).toBe('Please fill this in.');
    expect(form.message('address.city')).toBe('');
  });

  it('says what is wrong with each entry that was left, one after the other', () => {
    const form = make();
    form.group.controls.name.markAsTouched();
    form.group.controls.discount.setValue(120);
    form.group.controls.discount.markAsTouched();
    form.group.controls.address.controls.city.markAsTouched();
    expect(form.message('discount')).toBe('Must be at most 100.');
    expect(form.message('address.city')).toBe('At least 2 characters, please.');
  });

  it('gives its complaints to the controls too, so that Angular knows the form is not valid', () => {
    const { group } = make();
    expect(group.controls.address.controls.city.errors).toEqual({ complaint: 'At least 2 characters, please.' });
    expect(group.valid).toBe(false);
    group.setValue({ name: 'Holt', discount: null, address: { city: 'Ghent', lines: [] } });
    expect(group.valid).toBe(true);
  });

  it('shows a complaint deep inside an entry at that entry', () => {
    const form = make();
    form.group.controls.address.controls.lines.setValue(['short', 'far too long']);
    form.showAll();
    expect(form.message('address.lines')).toBe('At most 5 characters, please.');
    expect(form.message('address.lines.1')).toBe('At most 5 characters, please.');
    expect(form.message('address.lines.0')).toBe('');
  });

  it('sends nothing while something is wrong, and shows everything that is', async () => {
    const form = make();
    const work = jest.fn(() => Promise.resolve());
    await expect(form.send(work)).resolves.toBe(false);
    expect(work).not.toHaveBeenCalled();
    expect([form.message('name'), form.message('address.city')]).toEqual([
      'Please fill this in.',
      'At least 2 characters, please.',
    ]);
  });

  it('places the server’s complaints beside their entries until those change', async () => {
    const form = make();
    form.group.setValue({ name: 'Holt', discount: null, address: { city: 'Ghent', lines: [] } });
    const work = () => Promise.reject(refused([{ path: ['name'], message: 'There is a client of this name.' }]));
    await expect(form.send(work)).resolves.toBe(false);
    expect([form.message('name'), form.general()]).toEqual(['There is a client of this name.', []]);
    form.group.controls.address.controls.city.setValue('Bruges');
    expect(form.message('name')).toBe('There is a client of this name.');
    form.group.controls.name.setValue('Holt the younger');
    expect(form.message('name')).toBe('');
  });

  it('says of the whole what no entry stands for', async () => {
    const form = make();
    form.group.setValue({ name: 'Holt', discount: null, address: { city: 'Ghent', lines: [] } });
    await form.send(() => Promise.reject(refused([{ path: ['query', 'limit'], message: 'At most 100, please.' }])));
    expect(form.general()).toEqual(['At most 100, please.']);
    await form.send(() => Promise.reject(refused([], 'This cannot be done as things stand.')));
    expect(form.general()).toEqual(['This cannot be done as things stand.']);
  });

  it('throws on what is no refusal, and is ready to be sent again', async () => {
    const form = make();
    form.group.setValue({ name: 'Holt', discount: null, address: { city: 'Ghent', lines: [] } });
    await expect(form.send(() => Promise.reject(new TypeError('broken')))).rejects.toThrow('broken');
    expect(form.isSending()).toBe(false);
  });

  it('is sent once however often the button is pressed', async () => {
    const form = make();
    form.group.setValue({ name: 'Holt', discount: null, address: { city: 'Ghent', lines: [] } });
    let finish: () => void = () => undefined;
    const work = jest.fn(() => new Promise<void>((resolve) => (finish = resolve)));
    const first = form.send(work);
    await form.send(work);
    finish();
    await expect(first).resolves.toBe(true);
    expect(work).toHaveBeenCalledTimes(1);
  });

  it('knows a rule over several fields by the path it complains at', () => {
    TestBed.configureTestingModule({ providers: [words] });
    const span = z
      .strictObject({ low: z.number(), high: z.number() })
      .refine(({ low, high }) => low <= high, { ...complain('triple-low-above'), path: ['low'] });
    const form = TestBed.runInInjectionContext(() => schemaForm(span, { low: 5, high: 3 }));
    form.showAll();
    expect(form.message('low')).toBe('The low figure must not be above the likely one.');
  });

  it('begins again unvisited', () => {
    const form = make();
    form.showAll();
    form.group.controls.name.markAsDirty();
    form.group.controls.name.setValue('x');
    expect(form.isDirty()).toBe(true);
    form.reset({ name: '', discount: null, address: { city: '', lines: [] } });
    expect([form.message('name'), form.isDirty()]).toEqual(['', false]);
  });
});
