import { TestBed } from '@angular/core/testing';
import { Notices } from './notices';

describe('Notices', () => {
  beforeEach(() => jest.useFakeTimers());
  afterEach(() => jest.useRealTimers());

  it('lets what went well pass by itself, and what went wrong stand', () => {
    const notices = TestBed.inject(Notices);
    notices.say('Kept.');
    notices.complain('Not kept.');
    jest.advanceTimersByTime(20_000);
    expect(notices.current().map(({ text }) => text)).toEqual(['Not kept.']);
    notices.close(notices.current()[0].id);
    expect(notices.current()).toEqual([]);
  });

  it('leaves longer to undo something', () => {
    const notices = TestBed.inject(Notices);
    notices.say('Removed.', { label: 'Undo', run: () => undefined });
    jest.advanceTimersByTime(7000);
    expect(notices.current()).toHaveLength(1);
  });

  it('never shows more than three', () => {
    const notices = TestBed.inject(Notices);
    ['a', 'b', 'c', 'd'].forEach((text) => notices.say(text));
    expect(notices.current().map(({ text }) => text)).toEqual(['b', 'c', 'd']);
  });
});
