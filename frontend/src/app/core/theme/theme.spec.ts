import { TestBed } from '@angular/core/testing';
import { Theme } from './theme';

describe('Theme', () => {
  afterEach(() => localStorage.clear());

  const start = () => {
    TestBed.resetTestingModule();
    const theme = TestBed.inject(Theme);
    TestBed.tick();
    return theme;
  };

  it('follows the device until somebody chooses', () => {
    start();
    expect(document.documentElement.hasAttribute('data-theme')).toBe(false);
  });

  it('keeps a choice for the next visit, and forgets it with the device’s own', () => {
    start().choose('dark');
    TestBed.tick();
    expect(document.documentElement.getAttribute('data-theme')).toBe('dark');
    const later = start();
    expect(later.choice()).toBe('dark');
    later.choose('system');
    TestBed.tick();
    expect([document.documentElement.hasAttribute('data-theme'), localStorage.length]).toEqual([false, 0]);
  });

  it('takes no notice of something else kept under its name', () => {
    localStorage.setItem('bolewright-theme', 'purple');
    expect(start().choice()).toBe('system');
  });
});
