import { inputBinding, outputBinding, signal } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { signIn, words } from '../../../test/sign-in';
import type { Explained } from './explained';
import { Explanation } from './explanation';
import { Figure } from './figure';
import { ReasonPanel } from './reason-panel';

const explained = (figure: number): Explained => ({
  id: 'zone-1-leaves',
  heading: `${figure} leaves`,
  reasons: [
    { code: 'entry-not-whole', values: {}, figure: 1.35, unit: 'factor', house: 'leaf.reliefs.middle' },
    { code: 'entry-too-small', values: { minimum: 3 }, figure: 59.1, unit: 'mm' },
    { code: 'entry-unknown', values: {}, figure: 'in the round', unit: 'text' },
  ],
  total: { label: 'leaves, 40 to 46', figure: String(figure) },
});

describe('A figure and the panel of its reasons', () => {
  beforeEach(() => {
    TestBed.configureTestingModule({ providers: [words] });
    signIn();
  });

  it('explain themselves when the figure is selected, house values marked and open to change', async () => {
    const chosen: string[] = [];
    const figure = TestBed.createComponent(Figure, {
      bindings: [inputBinding('text', () => '41.9'), inputBinding('explained', () => explained(41.9))],
    });
    const panel = TestBed.createComponent(ReasonPanel, {
      bindings: [outputBinding<string>('houseChosen', (house) => chosen.push(house))],
    });
    await figure.whenStable();
    const [figureElement, panelElement] = [figure.nativeElement as HTMLElement, panel.nativeElement as HTMLElement];
    figureElement.querySelector('button')?.click();
    await panel.whenStable();
    expect(panelElement.querySelector('h4')?.textContent).toBe('41.9 leaves, because');
    const figures = [...panelElement.querySelectorAll('.figure')].map((one) =>
      one.textContent?.replaceAll('\u00a0', ' '),
    );
    expect(figures).toEqual(['× 1.35', '59.1 mm', 'in the round', '41.9']);
    expect(figureElement.querySelector('button')?.getAttribute('aria-pressed')).toBe('true');
    panelElement.querySelector<HTMLButtonElement>('.house')?.click();
    expect(chosen).toEqual(['leaf.reliefs.middle']);
  });

  it('mark house values and open none to whoever may not change them', async () => {
    TestBed.inject(Explanation).show(explained(41.9));
    const panel = TestBed.createComponent(ReasonPanel, { bindings: [inputBinding('mayChange', () => false)] });
    await panel.whenStable();
    const marks = (panel.nativeElement as HTMLElement).querySelectorAll('.house');
    expect([...marks].map(({ tagName, textContent }) => [tagName, textContent])).toEqual([['SPAN', 'house value']]);
  });

  it('follow the figure while it is worked out anew', async () => {
    const current = signal(explained(41.9));
    const figure = TestBed.createComponent(Figure, {
      bindings: [inputBinding('text', () => '41.9'), inputBinding('explained', current)],
    });
    await figure.whenStable();
    (figure.nativeElement as HTMLElement).querySelector('button')?.click();
    current.set(explained(43));
    await figure.whenStable();
    expect(TestBed.inject(Explanation).current()?.heading).toBe('43 leaves');
  });

  it('are plain text where there is nothing to explain', async () => {
    const figure = TestBed.createComponent(Figure, { bindings: [inputBinding('text', () => '4')] });
    await figure.whenStable();
    const element = figure.nativeElement as HTMLElement;
    expect([element.querySelector('button'), element.textContent?.trim()]).toEqual([null, '4']);
  });
});
