import { TestBed } from '@angular/core/testing';
import { Notices } from './notices';
import { PageErrorHandler } from './page-error-handler';
import { ProblemError } from './problem-error';

const refusal = new ProblemError({
  type: 'x',
  title: 'This cannot be done as things stand.',
  status: 409,
  instance: '',
  errors: [],
});

describe('PageErrorHandler', () => {
  let handler: PageErrorHandler;
  const said = () =>
    TestBed.inject(Notices)
      .current()
      .map(({ text }) => text);

  beforeEach(() => {
    TestBed.configureTestingModule({ providers: [PageErrorHandler] });
    handler = TestBed.inject(PageErrorHandler);
  });

  it.each([
    ['itself', refusal],
    ['out of a promise', { rejection: refusal }],
    ['wrapped by Angular', new Error('in a listener', { cause: refusal })],
  ])('says a refusal %s in its own words', (_, error) => {
    handler.handleError(error);
    expect(said()).toEqual(['This cannot be done as things stand.']);
  });

  it('says once, in general words, that something of ours broke, and leaves it in the console', () => {
    const console_error = jest.spyOn(console, 'error').mockImplementation(() => undefined);
    handler.handleError(new TypeError('undefined is not a leaf'));
    handler.handleError(new TypeError('undefined is not a leaf'));
    expect(said()).toHaveLength(1);
    expect(said()[0]).not.toContain('undefined');
    expect(console_error).toHaveBeenCalledTimes(2);
    console_error.mockRestore();
  });
});
