import { inputBinding, outputBinding } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import type { Finding } from '#shared/words/finding';
import { signIn, words } from '../../../test/sign-in';
import { FindingList } from './finding-list';

const findings: readonly Finding[] = [
  { kind: 'note', code: 'entry-not-whole', values: {} },
  { kind: 'caution', code: 'entry-unknown', values: {} },
  { kind: 'refuse', code: 'entry-missing', values: {}, about: 'zone-1' },
];

describe('FindingList', () => {
  it('puts what stops an issue first, says each kind aloud, and leads to what it is about', async () => {
    TestBed.configureTestingModule({ providers: [words] });
    signIn();
    const chosen: Finding[] = [];
    const fixture = TestBed.createComponent(FindingList, {
      bindings: [
        inputBinding('findings', () => findings),
        inputBinding('linked', () => true),
        outputBinding<Finding>('chosen', (one) => chosen.push(one)),
      ],
    });
    await fixture.whenStable();
    const element = fixture.nativeElement as HTMLElement;
    const lines = [...element.querySelectorAll('li')].map((line) => line.textContent?.trim().replace(/\s+/g, ' '));
    expect(lines).toEqual([
      'Stops an issue: Please fill this in.',
      'Caution: This entry is not known here.',
      'Note: Whole numbers only.',
    ]);
    element.querySelector('button')?.click();
    expect(chosen.map(({ about }) => about)).toEqual(['zone-1']);
  });

  it('calls a refusal what it is called where it stands', async () => {
    TestBed.configureTestingModule({ providers: [words] });
    signIn();
    const fixture = TestBed.createComponent(FindingList, {
      bindings: [inputBinding('findings', () => findings.slice(2)), inputBinding('stops', () => 'Cannot be')],
    });
    await fixture.whenStable();
    const [line] = (fixture.nativeElement as HTMLElement).querySelectorAll('li');
    expect(line.textContent?.trim().replace(/\s+/g, ' ')).toBe('Cannot be: Please fill this in.');
  });
});
