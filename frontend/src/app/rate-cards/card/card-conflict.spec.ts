import { TestBed } from '@angular/core/testing';
import { startCard } from '#shared/rate-cards/start-card';
import type { RateCard } from '#shared/rate-cards/rate-card';
import type { CardSide } from '#shared/rate-cards/merged-values';
import type { WholeRateCard } from '#shared/rate-cards/rate-cards-endpoints';
import { withValueAt } from '#shared/rate-cards/tables/value-at';
import { signIn, words } from '../../../test/sign-in';
import { RateCardCalls } from '../rate-card-calls';
import { CardConflict } from './card-conflict';
import { CardStore } from './card-store';

const gilder = ['money', 'grades', 2, 'costPerHour'];

describe('CardConflict', () => {
  const spoken = (node: Element | null | undefined) => (node?.textContent ?? '').replace(/\s+/g, ' ').trim();

  function shown(mine: RateCard, theirs: RateCard) {
    const kept = { id: 'card', version: 1, name: 'Spring', state: 'draft', content: startCard } as WholeRateCard;
    TestBed.configureTestingModule({ providers: [words, CardStore, { provide: RateCardCalls, useValue: {} }] });
    signIn(['owner']);
    const store = TestBed.inject(CardStore);
    store.put(kept);
    store.enterContent(mine);
    const fixture = TestBed.createComponent(CardConflict);
    fixture.componentRef.setInput('theirs', { ...kept, version: 2, content: theirs as WholeRateCard['content'] });
    fixture.detectChanges();
    const element = fixture.nativeElement as HTMLElement;
    let settled: ((key: string) => CardSide) | undefined;
    fixture.componentInstance.settled.subscribe((sideOf) => (settled = sideOf));
    const button = (text: string) =>
      [...element.querySelectorAll('button')].find((one) => spoken(one) === text) as HTMLButtonElement;
    return { fixture, element, button, settled: () => settled };
  }

  it('asks about each line both changed, in words, and is settled when all are chosen', () => {
    const [mine, theirs] = [withValueAt(startCard, gilder, '34.00'), withValueAt(startCard, gilder, '40.00')];
    const { fixture, element, button, settled } = shown(mine, theirs);
    expect([...element.querySelectorAll('legend')].map(spoken)).toEqual(['Gilder Cost an hour, €']);
    expect([...element.querySelectorAll('label')].map(spoken)).toEqual(['yours: 34.00', 'theirs: 40.00']);
    expect(button('Keep the draft like this').disabled).toBe(true);
    element.querySelectorAll('input')[1].dispatchEvent(new Event('change'));
    fixture.detectChanges();
    button('Keep the draft like this').click();
    expect(settled()?.('content/money/grades/gilder/costPerHour')).toBe('theirs');
  });

  it('says of a row that one took away and the other changed what becomes of it', () => {
    const grades = startCard.money.grades.filter(({ id }) => id !== 'gilder');
    const mine: RateCard = { ...startCard, money: { ...startCard.money, grades } };
    const { element } = shown(mine, withValueAt(startCard, gilder, '40.00'));
    expect([...element.querySelectorAll('label')].map(spoken)).toEqual(['yours: taken away', 'theirs: stays']);
  });
});
