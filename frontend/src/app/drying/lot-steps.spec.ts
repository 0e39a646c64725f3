import { inputBinding } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { startBuildUps } from '#shared/buildups/start-buildups';
import { lotWorks } from '#shared/buildups/lot-works';
import { zoneForSpecs } from '#shared/buildups/zone-for-specs';
import { lotSequence } from '#shared/drying/lot-sequence';
import { startDrying } from '#shared/drying/start-drying';
import { Explanation } from '../ui/figure/explanation';
import { signIn, words } from '../../test/sign-in';
import { LotSteps } from './lot-steps';

const cards = { buildUps: startBuildUps, drying: startDrying };
const laying = { way: 'sheets', form: 'loose', counts: { first: 100, faulting: 10, second: 5 } } as const;
const [work] = lotWorks([zoneForSpecs({ laying })], startBuildUps);
const reference = { temperature_celsius: 20, humidity_percent: 50 };

describe('LotSteps', () => {
  it('says of every step what the ribbon shows: coats, drying, what waits for whom and what is done when a time is missed', async () => {
    if (!work) throw new Error('the card builds nothing up in water');
    TestBed.configureTestingModule({ providers: [words] });
    signIn();
    const { steps, findings } = lotSequence(work, reference, cards);
    const tasks = [{ stepId: 'gesso', coat: 1, portion: 1, start_minutes: 1440, end_minutes: 4330 }];
    const lot = { lotId: work.id, name: 'Water', steps, tasks, start_minutes: 0, end_minutes: 0 };
    const whole = { ...lot, handsOn_minutes: 0, drying_minutes: 0, waiting_minutes: 0 };
    const fixture = TestBed.createComponent(LotSteps, {
      bindings: [inputBinding('lot', () => whole), inputBinding('findings', () => findings)],
    });
    await fixture.whenStable();
    const rows = [...(fixture.nativeElement as HTMLElement).querySelectorAll('tbody tr')].map((row) =>
      [...row.children].map((cell) => cell.textContent?.trim().replace(/[\s\u00a0\u202f]+/g, ' ')),
    );
    const gesso = rows.find(([name]) => name?.startsWith('Gesso'));
    // Eight coats on flats, half an hour between them, a day before smoothing; all within two days.
    expect(gesso?.slice(1)).toEqual(['8', expect.any(String), '30 min', '1 d', 'from 1 d, stands open', 'day 2 to 4']);
    expect(gesso?.[0]).toContain('All coats within 2 d.');
    expect(rows[0]?.[0]).toContain('waits until the carving is approved');
    expect(rows.find(([name]) => name?.startsWith('Wet and lay'))?.[0]).toContain('revive the bole with damp breath');
    // What of its hands-on time is set-up is told of the time, not of the drying.
    const buttons = [...(fixture.nativeElement as HTMLElement).querySelectorAll<HTMLButtonElement>('tbody button')];
    const told = buttons.map((button) => {
      button.click();
      return TestBed.inject(Explanation)
        .current()
        ?.reasons.map(({ code }) => code);
    });
    expect(told.filter((codes) => codes?.includes('buildup-hours-set-up'))).toContainEqual(['buildup-hours-set-up']);
    // An edge nobody protects takes no time, so it is no step here.
    expect(rows.some(([name]) => name === 'Protect the edge')).toBe(false);
  });
});
