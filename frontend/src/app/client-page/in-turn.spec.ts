import { ChangeDetectionStrategy, Component, signal } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { inTurn } from './in-turn';

let shown = signal(1);

@Component({ selector: 'app-parts', changeDetection: ChangeDetectionStrategy.OnPush, template: '{{ shown() }}' })
class Parts {
  readonly shown = shown;

  constructor() {
    inTurn(3, shown);
  }
}

describe('inTurn', () => {
  beforeEach(() => (shown = signal(1)));
  const task = () => new Promise((resolve) => setTimeout(resolve));

  it('shows one part, and one more in a task of its own each time the page was drawn, up to the last', async () => {
    const fixture = TestBed.createComponent(Parts);
    const { componentInstance: parts } = fixture;
    const seen = [];
    for (let turn = 0; turn < 5; turn++) {
      seen.push(parts.shown());
      TestBed.tick();
      await task();
    }
    expect(seen).toEqual([1, 2, 3, 3, 3]);
  });

  it('keeps the page from being called finished until all are there', async () => {
    const fixture = TestBed.createComponent(Parts);
    fixture.autoDetectChanges();
    await fixture.whenStable();
    expect((fixture.nativeElement as HTMLElement).textContent).toBe('3');
  });

  it('shows all at once when they come back', async () => {
    shown.set(3);
    const fixture = TestBed.createComponent(Parts);
    TestBed.tick();
    await task();
    expect(fixture.componentInstance.shown()).toBe(3);
  });

  it('stops with the page', async () => {
    const fixture = TestBed.createComponent(Parts);
    TestBed.tick();
    fixture.destroy();
    await task();
    expect(fixture.componentInstance.shown()).toBe(1);
  });
});
