import { type ComponentFixture, TestBed } from '@angular/core/testing';
import { MAT_DIALOG_DATA } from '@angular/material/dialog';
import { memberForSpecs, ornamentForSpecs, zoneEntryForSpecs } from '#shared/estimates/member-for-specs';
import type { Member, MemberContent } from '#shared/estimates/member';
import { shapeKinds } from '#shared/measure/shape';
import { shapeDefaults } from '#shared/measure/shape-defaults';
import { signIn, words } from '../../../test/sign-in';
import { fieldNames } from '../../audit';
import { StaleDialog } from './stale-dialog';

const contentOf = ({ id: _id, ...content }: Member): MemberContent => content;
const mine = contentOf(memberForSpecs({ name: 'Frieze', ornaments: [ornamentForSpecs()] }));

describe('StaleDialog', () => {
  let fixture: ComponentFixture<StaleDialog>;
  const rows = () =>
    [...(fixture.nativeElement as HTMLElement).querySelectorAll('tbody tr')].map((row) =>
      [...row.children].map((cell) => cell.textContent?.replace(/\u00a0/g, ' ').trim()),
    );

  function open(theirs: MemberContent | null): void {
    const conflict = { mine: { kind: 'member', id: 'member', content: mine }, theirs };
    TestBed.configureTestingModule({ providers: [words, { provide: MAT_DIALOG_DATA, useValue: conflict }] });
    signIn();
    fixture = TestBed.createComponent(StaleDialog);
    fixture.detectChanges();
  }

  it('names what both sides made of each field, in words', () => {
    open({
      ...mine,
      count: 3,
      shape: { kind: 'rectangle', length_mm: 640, height_mm: 500 },
      zones: [zoneEntryForSpecs({ relief: 'high' }), zoneEntryForSpecs({ id: 'other', name: 'Ground' })],
      ornaments: [],
    });
    expect(rows()).toEqual([
      ['How many', '1', '3'],
      ['Shape, length', '500 mm', '640 mm'],
      ['Zone “Ground”', '–', 'is there'],
      ['Zone “Face”, relief', 'flat', 'high'],
      ['Ornament “rosette”', 'is there', '–'],
    ]);
  });

  it('says that it was removed', () => {
    open(null);
    expect(fixture.nativeElement.textContent).toContain('They removed it.');
  });

  it('has words for every field a member can have', () => {
    const keysOf = (value: unknown): string[] => {
      if (Array.isArray(value)) return value.flatMap(keysOf);
      if (typeof value !== 'object' || value === null) return [];
      return Object.entries(value).flatMap(([key, inner]) => [key, ...keysOf(inner)]);
    };
    const flutes = { cut: 'flutes', width_mm: 1, depth_mm: 1, between_mm: 1, share_percent: 1 };
    const members = shapeKinds.map((kind) => ({ ...mine, shape: { ...shapeDefaults(kind), fluting: flutes } }));
    const run = { way: 'run', run_mm: 1, runs: 1, mitreLeaf_mm: 1, mitreLeaves: 1, centre_mm: 1 };
    const keys = new Set(keysOf([members, { extent: run }, { extent: { area_mm2: 1 } }]));
    const unspoken = ['id', 'typed'];
    expect([...keys].filter((key) => !unspoken.includes(key) && !(key in fieldNames))).toEqual([]);
  });
});
