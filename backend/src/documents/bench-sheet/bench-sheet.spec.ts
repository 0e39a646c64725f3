import { leaveSample, factsOf, pagesOf, textOfPaper } from '../../../../test/documents/paper-text';
import { longDraft, smallDraft } from '../../../../test/documents/sample-draft';
import { sampleSnapshot } from '../../../../test/documents/sample-snapshot';
import { memberForSpecs } from '#shared/estimates/member-for-specs';
import type { Opening } from '#shared/measure/opening';
import { benchSheet } from './bench-sheet';

jest.setTimeout(60_000);

const { workshop, job, draft, figures, issuedAt: madeAt, issuedOn: madeOn } = sampleSnapshot(smallDraft());
const request = { workshop, job, draft, figures, pieceId: 'piece-1', madeAt, madeOn };

describe('the bench sheet of a piece', () => {
  let pdf: Buffer;
  let text: string;
  beforeAll(async () => {
    pdf = await benchSheet(request);
    leaveSample('bench-sheet.pdf', pdf);
    text = textOfPaper(pdf);
  });

  it('knows no price', () => {
    expect(text).not.toMatch(/€|\bEUR\b/);
    expect(text).not.toMatch(/\b(price|costs?|margin|overhead|tax|discount)\b/i);
    for (const { costPerHour } of sampleSnapshot(smallDraft()).card.money.grades)
      expect(text).not.toContain(costPerHour);
  });

  it('gives the members with count, timber, and ornament at its fitted pitch', () => {
    // 2,860 mm of egg and dart at a module of 30 mm are 95 repeats of 30.1 mm.
    expect(text).toMatch(/Egg and dart +95 +95 +30\.1 mm/);
    expect(text).toContain('4 alike · Lime (basswood)');
    expect(text).toMatch(/Acanthus leaf +8\b/);
  });

  it('gives the build-ups step by step with coats, windows and what is waited for', () => {
    expect(text).toMatch(/Gesso +4 to 8 /);
    expect(text).toContain('Waits until the sample board is approved.');
    expect(text).toMatch(/12-hour oil size .* from 12 h to 22 h/);
    expect(text).toContain('Burnish: finished within 1 d of beginning this.');
  });

  it('heads each lot with its name and what is coated in it', async () => {
    expect(text).toContain('Wood Top edge, Leg, heron Step');
    const own = smallDraft();
    const members = own.members.map((member) => (member.id === 'leg' ? { ...member, lot: 'Legs' } : member));
    const apart = sampleSnapshot({ ...own, members });
    const sheet = textOfPaper(await benchSheet({ ...request, draft: apart.draft, figures: apart.figures }));
    expect(sheet).toContain('Wood Top edge Step');
    expect(sheet).toContain('Legs: Water gilding, burnished Tone');
    expect(sheet).toContain('Wood Leg, heron Step');
    // The edge is recut and gets eight coats, the carved legs four.
    expect(sheet).not.toMatch(/Gesso +4 to 8 /);
  });

  it('names what is cut out of a member, and draws it where the face is flat', async () => {
    const own = smallDraft();
    const openings: Opening[] = [
      { id: 'grip', count: 2, shape: { kind: 'rectangle', length_mm: 120, height_mm: 60 } },
      { id: 'hole', count: 1, shape: { kind: 'circle', diameter_mm: 25 } },
    ];
    const panel = memberForSpecs({ id: 'panel', pieceId: 'piece-1', name: 'Panel', openings });
    const pierced = sampleSnapshot({ ...own, members: [...own.members, panel] });
    const sheet = textOfPaper(await benchSheet({ ...request, draft: pierced.draft, figures: pierced.figures }));
    expect(sheet).toContain('Openings in each: 2 × rectangle 120 mm by 60 mm, 1 × circle 25 mm across.');
    expect(sheet).toMatch(/face, 1 : \d+\. Openings are dashed: take their place from the piece\./);
    expect(text).not.toMatch(/[Oo]penings/);
  });

  it('says how the leaf is laid', () => {
    expect(text).toContain('3 strips a leaf, 26.7 mm wide, laps 3.2 mm.');
    expect(text).toContain('patches, each leaf cut 2 by 2, laps 3.2 mm.');
    expect(text).toMatch(/Lay plan, Ovolo, 1 : \d+/);
  });

  it('says once what can hurt, and whom to ask', () => {
    expect(text).toContain('Wood dust, of soft and hard timber alike, is known to cause cancer');
    expect(text.split('animal glue can cause allergy').length - 1).toBe(1);
    expect(text.split('have a structural engineer check base and fixing').length - 1).toBe(1);
    expect(text).toContain('Follow local codes and the product’s safety data sheet; ask a licensed professional.');
  });

  it('is tagged, titled, and the same bytes each time', async () => {
    expect(factsOf(pdf)).toMatch(/Title: +Bench sheet: Pier table/);
    expect(factsOf(pdf)).toMatch(/Tagged: +yes/);
    expect(pdf.equals(await benchSheet(request))).toBe(true);
  });

  it('keeps to its own piece', async () => {
    const long = sampleSnapshot(longDraft(6));
    const { draft: whole, figures: worked } = long;
    const sheet = await benchSheet({ ...request, draft: whole, figures: worked, pieceId: 'piece-2' });
    const pages = pagesOf(sheet).join(' ');
    expect(pages).toContain('Cabinet stand');
    expect(pages).toContain('Element 4,');
    expect(pages).not.toContain('Element 3,');
  });

  it('refuses a piece that is not there', () => {
    expect(() => benchSheet({ ...request, pieceId: 'another' })).toThrow(RangeError);
  });
});
