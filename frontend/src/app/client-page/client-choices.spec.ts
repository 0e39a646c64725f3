import { clientIssue, clientPrice, ClientVisit, offered } from '../../test/client-issue';

const sum = (visit: ClientVisit) => visit.element.querySelector('.bar .sum')?.textContent?.trim();
const choiceOf = (request: { request: { body: unknown } }) => (request.request.body as { choice: string[] }).choice;

async function priced(visit: ClientVisit, gross_minor: number): Promise<string[]> {
  const request = visit.asked('prices');
  const choice = choiceOf(request);
  request.flush(clientPrice(gross_minor, { choice }));
  await visit.settle();
  return choice;
}

describe('What a client may choose', () => {
  it('names the base by what it is made of, and says what each way is more or less than it', async () => {
    const visit = await ClientVisit.begin();
    const cards = [...visit.element.querySelectorAll('app-client-choices .card label')].map((label) =>
      (label.textContent ?? '').replace(/\s+/g, ' ').trim(),
    );
    expect(cards).toEqual([
      'Water gilding, burnished included',
      'Oil gilding −€615.00',
      'Silver leaf −€900.00',
      'A crate +€221.40',
      'A sample no difference',
    ]);
    expect(visit.text).toContain('Ready sooner: about 4 weeks instead of 6.');
    expect(visit.text).toContain('Takes longer: about 7 weeks instead of 6.');
  });

  it('says “as estimated” where the ways of a group take different things away', async () => {
    const issue = clientIssue();
    const [oil, silver] = issue.alternatives;
    if (!oil || !silver) throw new Error('the sample lost its alternatives');
    const visit = await ClientVisit.begin({ ...issue, alternatives: [oil, { ...silver, before: silver.after }] });
    expect(visit.choice('As estimated').checked).toBe(true);
  });

  it('takes one of a group and any extras, and the total follows', async () => {
    const visit = await ClientVisit.begin();
    expect(sum(visit)).toBe('€6,150.00');
    await visit.choose('Oil gilding');
    expect(await priced(visit, 5_535_00)).toEqual([offered.oil]);
    expect(sum(visit)).toBe('€5,535.00');
    await visit.choose('A crate');
    expect(await priced(visit, 5_756_40)).toEqual([offered.oil, offered.crate]);
    await visit.choose('Silver leaf');
    expect(await priced(visit, 5_471_40)).toEqual([offered.crate, offered.silver]);
    expect([visit.choice('Oil gilding').checked, visit.choice('Silver leaf').checked]).toEqual([false, true]);
    await visit.choose('Water gilding, burnished');
    expect(await priced(visit, 6_371_40)).toEqual([offered.crate]);
    await visit.choose('A crate');
    visit.http.expectNone((request) => request.url.endsWith('/prices'));
    expect(sum(visit)).toBe('€6,150.00');
  });

  it('keeps the last price, faintly, and lets nothing be reviewed while the next one is on its way', async () => {
    const visit = await ClientVisit.begin();
    await visit.choose('Oil gilding');
    const request = visit.asked('prices');
    expect(sum(visit)).toBe('€6,150.00');
    expect(visit.element.querySelector('.bar .sum')?.classList).toContain('pending');
    expect(visit.button('Review')?.disabled).toBe(true);
    request.flush(clientPrice(5_535_00, { choice: [offered.oil] }));
    await visit.settle();
    expect(visit.button('Review')?.disabled).toBe(false);
  });

  it('says why a price did not come, and offers no review of it', async () => {
    const visit = await ClientVisit.begin();
    await visit.choose('Oil gilding');
    const title = 'These alternatives do not go together. Please ask the workshop.';
    const problem = { type: 'about:blank', title, status: 409, instance: '', errors: [] };
    visit.asked('prices').flush(problem, { status: 409, statusText: 'Conflict' });
    await visit.settle();
    expect(visit.element.querySelector('.bar [role=alert]')?.textContent).toBe(title);
    expect(visit.button('Review')?.disabled).toBe(true);
    await visit.choose('Water gilding, burnished');
    expect(visit.button('Review')?.disabled).toBe(false);
  });

  it('cannot be changed where the issue is accepted as it stands', async () => {
    const visit = await ClientVisit.begin(clientIssue({ mayChoose: false }));
    const areas = [...visit.element.querySelectorAll('fieldset')];
    expect(areas.map(({ disabled }) => disabled)).toEqual([true, true]);
    expect(visit.text).toContain('If you would like one of them, ask below');
  });

  it('shows the section of what each way is made of', async () => {
    const visit = await ClientVisit.begin();
    const strips = [...visit.element.querySelectorAll('app-client-choices svg')];
    expect(strips.map((strip) => strip.getAttribute('aria-label'))).toEqual([
      'Gold 23½ ct (2); Water gilding, burnished gesso (2); Wood (2)',
      'Gold 23½ ct (2); Oil gilding gesso (2); Wood (2)',
      'Silver (2); Oil gilding gesso (2); Wood (2)',
    ]);
  });
});
