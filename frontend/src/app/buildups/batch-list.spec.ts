import { inputBinding } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { recipeBatches } from '#shared/buildups/recipe-batches';
import { startBuildUps } from '#shared/buildups/start-buildups';
import { zoneForSpecs } from '#shared/buildups/zone-for-specs';
import { signIn, words } from '../../test/sign-in';
import { BatchList } from './batch-list';

describe('BatchList', () => {
  it('says what to mix of each size, the glue by weight as well', async () => {
    TestBed.configureTestingModule({ providers: [words] });
    signIn();
    const buildUp = startBuildUps.buildUps.find(({ id }) => id === 'water-burnished') ?? null;
    const batches = recipeBatches([{ buildUp, facts: zoneForSpecs({}) }], startBuildUps);
    const fixture = TestBed.createComponent(BatchList, { bindings: [inputBinding('batches', () => batches)] });
    await fixture.whenStable();
    const rows = [...(fixture.nativeElement as HTMLElement).querySelectorAll('tbody tr')].map((row) =>
      [...row.children].map((cell) => cell.textContent?.trim().replace(/[\u00a0\u202f]/g, ' ')),
    );
    // A square metre takes 0.8 L of 10 : 1: one part in eleven is glue, 72.7 mL of 0.7 kg a litre.
    expect(rows.find(([name]) => name === 'Gesso size 10 : 1')).toEqual([
      'Gesso size 10 : 1',
      'Dry glue 50.9 g (72.7 mL) · Water 727.3 mL',
      '800 mL',
    ]);
  });
});
