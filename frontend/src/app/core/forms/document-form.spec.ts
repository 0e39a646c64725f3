import { Injector, runInInjectionContext } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import * as z from 'zod';
import { signIn, words } from '../../../test/sign-in';
import { type DocumentForm, documentForm } from './document-form';

const size = z.number().min(0).max(1000);
const pieceSchema = z.strictObject({
  name: z.string().min(1),
  shape: z.discriminatedUnion('kind', [
    z.strictObject({ kind: z.literal('circle'), diameter_mm: size }),
    z.strictObject({ kind: z.literal('plank'), sides_mm: z.array(size).min(1), hole_mm2: size.optional() }),
  ]),
  typed: z.record(z.string(), z.string()),
});

const plank = {
  name: 'Rail',
  shape: { kind: 'plank', sides_mm: [600, 40] },
  typed: { 'shape.sides_mm.0': '60 cm' },
} as const;

describe('DocumentForm', () => {
  let form: DocumentForm<typeof pieceSchema>;
  let edits: number;

  function open(settings: Parameters<typeof signIn>[1] = {}): void {
    TestBed.configureTestingModule({ providers: [words] });
    signIn(['owner'], settings);
    form = runInInjectionContext(TestBed.inject(Injector), () => documentForm(pieceSchema));
    edits = 0;
    form.edited.subscribe(() => (edits += 1));
    form.reset(plank);
  }

  it('shows lengths as they were typed, and others as one types them here', () => {
    open();
    expect(form.control('shape.sides_mm.0').value).toEqual({ text: '60 cm', mm: 600 });
    expect(form.control('shape.sides_mm.1').value).toEqual({ text: '40', mm: 40 });
    expect([form.parsed(), edits]).toEqual([plank, 0]);
  });

  it('remembers what was typed with the unit it was meant in, and forgets what says no more than the figure', () => {
    open({ lengthUnit: 'in' });
    form.control('shape.sides_mm.0').setValue({ text: '2.375', mm: 60.325 });
    form.control('shape.sides_mm.1').setValue({ text: '1 1/2', mm: 38.1 });
    expect(form.parsed()?.typed).toEqual({ 'shape.sides_mm.0': '2.375 in' });
    expect(form.value('shape.sides_mm')).toEqual([60.325, 38.1]);
  });

  it('asks for each empty entry that was left, one after the other, those that came later too', () => {
    open();
    form.reset({ name: '', shape: { kind: 'circle', diameter_mm: null }, typed: {} });
    form.control('name').markAsTouched();
    expect([form.message('name'), form.message('shape.diameter_mm')]).toEqual(['Please fill this in.', '']);
    form.control('shape.diameter_mm').markAsTouched();
    expect(form.message('shape.diameter_mm')).toBe('Please fill this in.');
    form.reset({ name: '', shape: { kind: 'plank', sides_mm: [] }, typed: {} });
    form.control('name').markAsTouched();
    form.insert('shape.sides_mm', 0, 25);
    form.control('shape.sides_mm.0').markAsPristine();
    form.control('shape.sides_mm.0').setValue(null);
    form.control('shape.sides_mm.0').markAsTouched();
    expect(form.message('shape.sides_mm.0')).toBe('Please fill this in.');
  });

  it('lets lists grow, shrink and change their order, texts going along', () => {
    open();
    form.insert('shape.sides_mm', 2, 25);
    form.move('shape.sides_mm', 0, 2);
    expect(form.parsed()).toMatchObject({ shape: { sides_mm: [40, 25, 600] }, typed: { 'shape.sides_mm.2': '60 cm' } });
    form.remove('shape.sides_mm', 2);
    expect(form.parsed()).toMatchObject({ shape: { sides_mm: [40, 25] }, typed: {} });
    expect(edits).toBe(3);
  });

  it('puts one alternative in the place of another', () => {
    open();
    form.put('shape', { kind: 'circle', diameter_mm: 120 });
    expect(form.parsed()?.shape).toEqual({ kind: 'circle', diameter_mm: 120 });
    expect(form.has('shape.sides_mm')).toBe(false);
  });

  it('takes entries in and out', () => {
    open();
    form.put('shape.hole_mm2', 250);
    expect(form.control('shape.hole_mm2').value).toEqual({ text: '2.5 cm²', mm2: 250 });
    form.drop('shape.hole_mm2');
    expect(form.parsed()).toEqual(plank);
  });

  it('says what is wrong at its entry, and gives nothing out meanwhile', () => {
    open();
    form.control('shape.sides_mm.1').setValue({ text: '40000', mm: 40_000 });
    expect(form.message('shape.sides_mm.1')).toBe('Must be at most 1000\u00a0mm.');
    expect(form.message('shape.sides_mm.0')).toBe('');
    expect(form.parsed()).toBeUndefined();
    expect(form.entered()).toMatchObject({ shape: { sides_mm: [600, 40_000] } });
  });

  it('leaves an empty entry in peace until it was visited', () => {
    open();
    form.reset({ ...plank, name: '' });
    expect(form.message('name')).toBe('');
    form.control('name').markAsTouched();
    expect(form.message('name')).not.toBe('');
  });

  it('keeps what cannot be read, to be shown again', () => {
    open();
    form.control('shape.sides_mm.0').setValue({ text: 'long', mm: Number.NaN });
    const entered = form.entered() as typeof plank;
    form.reset(entered);
    expect(form.control('shape.sides_mm.0').value).toEqual({ text: 'long', mm: Number.NaN });
  });

  it('places complaints of the server, until the next change', () => {
    open();
    form.complain([{ path: 'name', text: 'That name is taken.' }]);
    expect(form.message('name')).toBe('That name is taken.');
    form.control('name').setValue('Rails');
    expect(form.message('name')).toBe('');
  });
});
