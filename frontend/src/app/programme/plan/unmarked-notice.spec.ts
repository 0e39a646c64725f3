import { TestBed, type ComponentFixture } from '@angular/core/testing';
import type { ProgrammeAnswer } from '#shared/programme/programme-schema';
import { signIn, words } from '../../../test/sign-in';
import { NOW } from '../../core/now';
import { AnsweringForSpecs, buttonIn, spoken } from '../answering-for-specs';
import { settledForSpecs } from '../settled-for-specs';
import { programmeForSpecs } from './programme-for-specs';
import { ProgrammeStore } from './programme-store';
import { UnmarkedNotice } from './unmarked-notice';

const stands = programmeForSpecs();
const firstMark = {
  ...{ taskId: 'carve', startedAt: '2027-01-04T08:00:00.000Z', endedAt: '2027-01-04T14:00:00.000Z' },
  ...{ left_minutes: 0, leftAt: '2027-01-04T08:00:00.000Z', personIds: ['cora'] },
};

describe('UnmarkedNotice', () => {
  let fixture: ComponentFixture<UnmarkedNotice>;
  let server: AnsweringForSpecs;
  const element = () => fixture.nativeElement as HTMLElement;
  const settle = () => settledForSpecs(fixture);
  async function open(change: Partial<ProgrammeAnswer>, now: string) {
    server = new AnsweringForSpecs({
      readProgramme: () => programmeForSpecs(change),
      readShop: () => ({ content: { people: [] } }),
      markAsPlanned: () => ({ marked: 1 }),
    });
    const time = { provide: NOW, useValue: () => new Date(now) };
    TestBed.configureTestingModule({ providers: [words, server.provider, time, ProgrammeStore] });
    signIn(['estimator']);
    TestBed.inject(ProgrammeStore).open(stands.estimateId, 0);
    fixture = TestBed.createComponent(UnmarkedNotice);
    await settle();
  }

  it('names what should have begun and was not marked, and says that it went as planned', async () => {
    await open({ isAccepted: true }, '2027-01-04T09:00:00Z');
    expect(spoken(element().querySelector('p'))).toBe(
      'Should have begun by now, and nobody marked it: Leg, Carving, Carver.',
    );
    buttonIn(element(), 'It all went as planned').click();
    await settle();
    expect(server.of('markAsPlanned')).toEqual([
      { params: { estimateId: stands.estimateId }, body: { taskIds: ['carve'] } },
    ]);
    expect(server.of('readProgramme')).toHaveLength(2);
  });

  it.each([
    ['before anything should have begun', { isAccepted: true }, '2027-01-04T07:00:00Z'],
    ['while it is a matter of minutes', { isAccepted: true }, '2027-01-04T08:30:00Z'],
    ['once it is marked', { isAccepted: true, marks: [firstMark] }, '2027-01-04T09:00:00Z'],
    ['of a job that is not accepted: nothing of it can have happened', {}, '2027-01-04T09:00:00Z'],
  ])('says nothing %s', async (_, change, now) => {
    await open(change, now);
    expect(spoken(element())).toBe('');
  });
});
