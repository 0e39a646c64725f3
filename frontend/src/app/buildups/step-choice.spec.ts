import { inputBinding, outputBinding } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { startBuildUps } from '#shared/buildups/start-buildups';
import { buildUpGroups, isBurnishedInPart, takesLeaf } from './build-up-groups';
import { StepChoice } from './step-choice';

const steps = startBuildUps.buildUps.find(({ id }) => id === 'oil-quick')?.steps ?? [];

describe('StepChoice', () => {
  it('offers what a build-up does not insist on, and hands out what is ticked', async () => {
    const told: (readonly string[])[] = [];
    const fixture = TestBed.createComponent(StepChoice, {
      bindings: [
        inputBinding('steps', () => steps),
        inputBinding('chosen', () => ['seal']),
        outputBinding<readonly string[]>('changed', (ids) => told.push(ids)),
      ],
    });
    await fixture.whenStable();
    const element = fixture.nativeElement as HTMLElement;
    const ticks = [...element.querySelectorAll('label')].map((label) => [
      label.textContent?.trim(),
      label.querySelector('input')?.checked,
    ]);
    expect(ticks).toEqual([
      ['Coloured ground', false],
      ['Seal where needed', true],
    ]);
    element.querySelectorAll('input').forEach((tick) => tick.click());
    expect(told).toEqual([['seal', 'coloured-ground'], []]);
  });
});

describe('Build-ups', () => {
  it('stand under their systems, each once', () => {
    const groups = buildUpGroups(startBuildUps.buildUps);
    expect(groups.map(({ name }) => name).slice(0, 2)).toEqual(['Water gilding', 'Oil gilding']);
    expect(groups.flatMap(({ buildUps }) => buildUps)).toHaveLength(startBuildUps.buildUps.length);
  });

  it('are known by what is done in them', () => {
    const of = (id: string) => startBuildUps.buildUps.filter((buildUp) => buildUp.id === id);
    expect(of('water-burnished-and-matte').map(isBurnishedInPart)).toEqual([true]);
    expect(of('water-burnished').map(isBurnishedInPart)).toEqual([false]);
    expect([...of('water-burnished'), ...of('white-glazes')].map(takesLeaf)).toEqual([true, false]);
  });
});
