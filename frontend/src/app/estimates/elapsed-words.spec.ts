import { TestBed } from '@angular/core/testing';
import { signIn, words } from '../../test/sign-in';
import { Formats } from '../core/formats/formats';
import { elapsedWords } from './elapsed-words';

describe('How long the work takes', () => {
  it.each([
    [0, 0, '0 working days', '0 weeks'],
    [1, 0.2, '1 working day', '0.2 weeks'],
    [5, 0.98, '5 working days', '1 week'],
    [12, 2.21, '12 working days', '2.2 weeks'],
  ])('of %f working days and %f weeks', (workingDays, weeks, days, long) => {
    TestBed.configureTestingModule({ providers: [words] });
    signIn();
    expect(elapsedWords(TestBed.inject(Formats), { workingDays, weeks })).toEqual({ days, weeks: long });
  });
});
