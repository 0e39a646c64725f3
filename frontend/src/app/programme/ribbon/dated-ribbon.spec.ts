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

  it('explains windows only where there are any', async () => {
    await open([ribbonLot('legs', [ribbonTask('lay', 480)])]);
    expect(element().querySelector('.legend')?.textContent).not.toContain('window open');
    TestBed.resetTestingModule();
    await open([ribbonLot('legs', [ribbonTask('lay', 480, { window: { start_minutes: 500, end_minutes: 900 } })])]);
    expect(element().querySelector('.legend')?.textContent).toContain('window open');
  });

  it('cuts no name at the left: the week the edge stands in is named there, where there is room', async () => {
    await open([ribbonLot('legs', [ribbonTask('lay', 480), ribbonTask('burnish', 480 + 20 * 1440)])]);
    const scroller = element().querySelector('.scroll') as HTMLElement;
    const heads = () => [...element().querySelectorAll<HTMLElement>('.day')];
    const scroll = async (left: number) => {
      scroller.scrollLeft = left;
      scroller.dispatchEvent(new Event('scroll'));
      await settle();
      return heads().map((one) => `${one.textContent} ${one.matches('.edge') ? 'at the edge' : ''}`.trim());
    };
    // The sixth of May 2027 is a Thursday: the first Monday comes four days after the left edge.
    expect((await scroll(0)).slice(0, 2)).toEqual(['3 May at the edge', '10 May']);
    const [monday, next] = heads().slice(1);
    const week_px = parseFloat(next.style.left) - parseFloat(monday.style.left);
    const monday_px = (week_px * 4) / 7;
    expect((await scroll(monday_px + 8)).slice(0, 2)).toEqual(['10 May at the edge', '17 May']);
    expect((await scroll(monday_px + week_px - 8))[0]).toBe('17 May');
  });

  it('draws a part of sixty lots of forty steps', async () => {
    await open(ribbonForSpecs(60, 40));
    expect(tasks().length).toBeGreaterThan(0);
    expect(tasks().length).toBeLessThan(600);
  });
});
