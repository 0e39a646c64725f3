import { inputBinding } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { signIn, words } from '../../../test/sign-in';
import { Money } from './money';

describe('Money', () => {
  it.each([
    [{ amount_minor: 2_332_000, whole: true }, '€23,320'],
    [{ amount_minor: 84_000, whole: true, signed: true }, '+€840'],
    [{ amount_minor: -114_050, signed: true }, '−€1,140.50'],
    [{ amount_minor: 0, signed: true }, '€0.00'],
  ])('writes %j as %s', async (inputs, text) => {
    TestBed.configureTestingModule({ providers: [words] });
    signIn();
    const bindings = Object.entries(inputs).map(([name, value]) => inputBinding(name, () => value));
    const fixture = TestBed.createComponent(Money, { bindings });
    await fixture.whenStable();
    expect((fixture.nativeElement as HTMLElement).textContent).toBe(text);
  });
});
