import { ChangeDetectionStrategy, Component, signal } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { inTurn } from './in-turn';

let shown = signal(1);

@Component({
  selector: 'app-parts',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: '{{ shown() }}<p></p>',
})
class Parts {
  readonly shown = shown;

  constructor() {
    inTurn(3, shown);
  }
}

const read = () => window.dispatchEvent(new Event('scroll'));
const task = () => new Promise((resolve) => setTimeout(resolve));

/** How many parts are shown, looked at after each of so many turns of the page. */
async function turns(count: number): Promise<number[]> {
  const seen: number[] = [];
  for (let turn = 0; turn < count; turn++) {
    seen.push(shown());
    TestBed.tick();
    await task();
  }
  return seen;
}

describe('inTurn', () => {
  beforeEach(() => (shown = signal(1)));

  it('shows one part until its reader goes on, and then one more in a task of its own each time the page was drawn', async () => {
    TestBed.createComponent(Parts);
    expect(await turns(3)).toEqual([1, 1, 1]);
    read();
    expect([...new Set(await turns(6))]).toEqual([1, 2, 3]);
  });

  it('shows the others by themselves to whoever does nothing', async () => {
    jest.useFakeTimers();
    try {
      TestBed.createComponent(Parts);
      TestBed.tick();
      await jest.advanceTimersByTimeAsync(3999);
      expect(shown()).toBe(1);
      for (let turn = 0; turn < 3; turn++) {
        await jest.advanceTimersByTimeAsync(1);
        TestBed.tick();
      }
      expect(shown()).toBe(3);
    } finally {
      jest.useRealTimers();
    }
  });

  it('has all of them on a print, at once', () => {
    const fixture = TestBed.createComponent(Parts);
    fixture.autoDetectChanges();
    window.dispatchEvent(new Event('beforeprint'));
    expect((fixture.nativeElement as HTMLElement).textContent).toBe('3');
  });

  it('shows all at once when they come back', async () => {
    shown.set(3);
    const fixture = TestBed.createComponent(Parts);
    TestBed.tick();
    await task();
    expect(fixture.componentInstance.shown()).toBe(3);
  });

  it('stops with the page, for a print too', async () => {
    const fixture = TestBed.createComponent(Parts);
    TestBed.tick();
    fixture.destroy();
    read();
    window.dispatchEvent(new Event('beforeprint'));
    await task();
    await task();
    expect(shown()).toBe(1);
  });
});
