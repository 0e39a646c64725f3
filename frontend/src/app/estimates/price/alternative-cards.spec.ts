import { TestBed } from '@angular/core/testing';
import { AlternativeCards } from './alternative-cards';
import type { AlternativeRow } from './alternative-rows';

const row = (id: string, given: Partial<AlternativeRow>): AlternativeRow => ({
  ...{ id, name: id, group: '', note: '', isBase: false, total: undefined },
  ...given,
});

describe('AlternativeCards', () => {
  const columns = [
    { key: 'hours', heading: 'Hours', kind: 'figure', text: () => '12.5', minor: ({ id }: AlternativeRow) => id },
  ];
  const rows = [row('base', { isBase: true }), row('oil', { note: 'A softer shine' }), row('bare', {})];

  function cards(isSelectable: boolean) {
    const fixture = TestBed.createComponent(AlternativeCards);
    fixture.componentRef.setInput('columns', columns);
    fixture.componentRef.setInput('rows', rows);
    fixture.componentRef.setInput('selectable', isSelectable);
    fixture.detectChanges();
    return fixture;
  }
  const texts = (element: HTMLElement, selector: string) =>
    [...element.querySelectorAll(selector)].map((one) => one.textContent.replace(/\s+/g, ' ').trim());

  it('have every figure with its label and what is small beneath it', () => {
    const element = cards(true).nativeElement as HTMLElement;
    expect(texts(element, 'li .name')).toEqual(['base', 'oil', 'bare']);
    expect(texts(element, 'li:nth-child(2) p')).toEqual(['A softer shine']);
    expect(texts(element, 'dt')).toEqual(['Hours', 'Hours', 'Hours']);
    expect(texts(element, 'dd')).toEqual(['12.5 base', '12.5 oil', '12.5 bare']);
  });

  it('open and close an alternative, never the base', () => {
    const fixture = cards(true);
    const buttons = [...(fixture.nativeElement as HTMLElement).querySelectorAll('button')];
    expect(buttons.map((one) => one.textContent.trim())).toEqual(['oil', 'bare']);
    buttons[0].click();
    expect(fixture.componentInstance.chosen()).toBe('oil');
    buttons[0].click();
    expect(fixture.componentInstance.chosen()).toBeUndefined();
  });

  it('are only read by whoever may not change them', () => {
    expect((cards(false).nativeElement as HTMLElement).querySelector('button')).toBeNull();
  });
});
