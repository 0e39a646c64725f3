import { inputBinding } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { signIn, words } from '../../test/sign-in';
import { HoldTable } from './hold-table';
import type { WorkedHold } from './worked-hold';

const day = 1440;
const evening = 480;

describe('HoldTable', () => {
  it('says of every approval how long it usually takes, when that is, and which steps wait for it', async () => {
    TestBed.configureTestingModule({ providers: [words] });
    signIn();
    const holds: readonly WorkedHold[] = [
      {
        ...{ hold: 'carving-approved', usual_days: 2, from_minutes: day, to_minutes: 2 * day + evening },
        waiting: [
          { lot: 'Water gilding', step: 'Size coat', start_minutes: 3 * day },
          { lot: 'Toned back', step: 'Size coat', start_minutes: null },
        ],
      },
      {
        ...{ hold: 'top-dry-fitted', usual_days: 1, from_minutes: 0, to_minutes: evening },
        waiting: [{ lot: 'Water gilding', step: 'Size coat', start_minutes: 3 * day }],
      },
    ];
    const fixture = TestBed.createComponent(HoldTable, { bindings: [inputBinding('holds', () => holds)] });
    await fixture.whenStable();
    const rows = [...(fixture.nativeElement as HTMLElement).querySelectorAll('tbody tr')].map((row) =>
      [...row.querySelectorAll('td')].map((cell) => cell.textContent?.trim().replaceAll('\u00a0', ' ')),
    );
    expect(rows).toEqual([
      [
        'Carving approved',
        '2 working days',
        'day 2 to 3',
        'Size coat of Water gilding, day 4; Size coat of Toned back',
      ],
      ['Top fitted dry', '1 working day', 'day 1', 'Size coat of Water gilding, day 4'],
    ]);
  });
});
