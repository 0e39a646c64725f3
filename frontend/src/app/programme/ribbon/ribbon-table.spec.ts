import { TestBed } from '@angular/core/testing';
import type { RibbonLot } from './ribbon-lot';
import { RibbonTable } from './ribbon-table';

const lot = {
  id: 'apron',
  name: 'Apron, water gilding',
  tasks: [{ id: 'gesso', name: 'Gesso', story: ['Gesso', 'Monday, 7 December, 8:00 to 11:30', 'Ida Marek'] }],
} as unknown as RibbonLot;

describe('RibbonTable', () => {
  it('stands on the paper at once when the page is printed, without having been opened', async () => {
    const fixture = TestBed.createComponent(RibbonTable);
    fixture.componentRef.setInput('first', 'Lot');
    fixture.componentRef.setInput('lots', [lot]);
    await fixture.whenStable();
    const { nativeElement } = fixture as { nativeElement: HTMLElement };
    expect(nativeElement.querySelector('table')).toBeNull();

    window.dispatchEvent(new Event('beforeprint'));

    expect(nativeElement.querySelector('details')?.open).toBe(true);
    expect(nativeElement.querySelector('tbody')?.textContent).toContain('Monday, 7 December, 8:00 to 11:30 Ida Marek');
  });
});
