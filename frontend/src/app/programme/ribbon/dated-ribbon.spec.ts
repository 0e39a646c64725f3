import { inputBinding, outputBinding } from '@angular/core';
import { type ComponentFixture, TestBed } from '@angular/core/testing';
import { provideRouter } from '@angular/router';
import { programmeFrame } from '#shared/programme/programme-frame';
import { signIn, words } from '../../../test/sign-in';
import { DatedRibbon } from './dated-ribbon';
import { ribbonForSpecs, ribbonLot, ribbonTask, StillObserver } from './ribbon-for-specs';
import type { RibbonLot } from './ribbon-lot';
import type { DraggedTask } from './task-drag';

describe('DatedRibbon', () => {
  let fixture: ComponentFixture<DatedRibbon>;
  const dropped: DraggedTask[] = [];
  const element = () => fixture.nativeElement as HTMLElement;
  const tasks = () => [...element().querySelectorAll<SVGGElement>('g.task')];
  const settle = async () => {
    await fixture.whenStable();
    TestBed.tick();
  };

  async function open(lots: readonly RibbonLot[]) {
    globalThis.ResizeObserver = StillObserver;
    TestBed.configureTestingModule({ providers: [words, provideRouter([])] });
    signIn();
    dropped.length = 0;
    fixture = TestBed.createComponent(DatedRibbon, {
      bindings: [
        inputBinding('label', () => 'Programme'),
        inputBinding('lots', () => lots),
        inputBinding('frame', () => programmeFrame('2027-05-06', 'Europe/Dublin')),
        inputBinding('open', () => []),
        outputBinding<DraggedTask>('dropped', (one) => dropped.push(one)),
      ],
    });
    await settle();
  }

  it('says of every task all there is to tell', async () => {
    await open([ribbonLot('legs', [ribbonTask('lay', 480)])]);
    expect(tasks().map((one) => one.getAttribute('aria-label'))).toEqual(['lay – lot At eight.']);
  });

  it('is entered at one task, and the arrows lead on', async () => {
    await open([ribbonLot('legs', [ribbonTask('lay', 480), ribbonTask('burnish', 700)])]);
    expect(tasks().map((one) => one.getAttribute('tabindex'))).toEqual(['0', '-1']);
    tasks()[0].dispatchEvent(new KeyboardEvent('keydown', { key: 'ArrowRight', bubbles: true }));
    await settle();
    expect(tasks().map((one) => one.getAttribute('tabindex'))).toEqual(['-1', '0']);
  });

  it('chooses a task that is pressed', async () => {
    await open([ribbonLot('legs', [ribbonTask('lay', 480)])]);
    tasks()[0].dispatchEvent(new MouseEvent('click', { bubbles: true }));
    await settle();
    expect(tasks()[0].getAttribute('aria-pressed')).toBe('true');
  });

  it('draws a part of sixty lots of forty steps', async () => {
    await open(ribbonForSpecs(60, 40));
    expect(tasks().length).toBeGreaterThan(0);
    expect(tasks().length).toBeLessThan(600);
  });
});
