import { clientIssue, clientPrice } from '../../test/client-issue';
import { OpenedWidget } from '../../test/opened-widget';
import { ClientLines } from './client-lines';
import { ClientPayments } from './client-payments';

const spoken = (node: Element) => (node.textContent ?? '').replace(/\s+/g, ' ').trim();

describe('ClientLines', () => {
  const open = (presentation: 'members' | 'kinds', more: Parameters<typeof clientPrice>[1] = {}) =>
    OpenedWidget.open(ClientLines, {
      inputs: { issue: clientIssue({ presentation }), price: clientPrice(6_150_00, more) },
      roles: ['owner'],
    });

  it('adds up member by member in the order of the piece, each opening to its work', async () => {
    const widget = await open('members');
    expect([...widget.element.querySelectorAll('summary, .line')].map(spoken)).toEqual([
      expect.stringMatching(/^Frieze ?€4,600.00$/),
      expect.stringMatching(/^Leg ?€400.00$/),
    ]);
    expect([...widget.element.querySelectorAll('details li')].map(spoken)).toEqual([
      'Carving €4,000.00',
      'Gilding €600.00',
    ]);
  });

  it('adds up by kind of work where the estimate is presented so', async () => {
    const widget = await open('kinds');
    expect([...widget.element.querySelectorAll('summary, .line')].map(spoken)).toEqual([
      expect.stringMatching(/^Carving ?€4,000.00$/),
      expect.stringMatching(/^Gilding ?€1,000.00$/),
    ]);
  });

  it('shows discount, net, each tax and the total', async () => {
    const exempt = {
      ...{ name: 'Exempt', code: 'E' as const, percent: '0', exemptionReason: 'A listed building.' },
      ...{ net_minor: 0, tax_minor: 0 },
    };
    const taxes = [...clientPrice(6_150_00).taxes, exempt];
    const widget = await open('members', { discount_minor: 250_00, taxes });
    expect([...widget.element.querySelectorAll('dl > div')].map(spoken)).toEqual([
      expect.stringMatching(/^Discount ?-€250.00$|^Discount ?−€250.00$/),
      expect.stringMatching(/^Net ?€5,000.00$/),
      expect.stringMatching(/^VAT: 23% of €5,000.00 ?€1,150.00$/),
      expect.stringMatching(/^Exempt: A listed building\. ?€0.00$/),
      expect.stringMatching(/^Total ?€6,150.00$/),
    ]);
  });

  it('shows the total alone, and why, where nothing is taxed', async () => {
    const outside = {
      ...{ name: 'Outside', code: 'O' as const, percent: '0', exemptionReason: 'Not subject to tax here.' },
      ...{ net_minor: 5_000_00, tax_minor: 0 },
    };
    const widget = await open('members', { discount_minor: 250_00, taxes: [outside] });
    expect([...widget.element.querySelectorAll('dl > div')].map(spoken)).toEqual([
      expect.stringMatching(/^Discount ?[-−]€250.00$/),
      expect.stringMatching(/^Total ?€6,150.00$/),
    ]);
    expect(spoken(widget.element.querySelector('dl + .note') as Element)).toBe('Not subject to tax here.');
  });

  it('says by what measured work is paid, and nothing of what one of it costs', async () => {
    const [line] = clientPrice(6_150_00).lines;
    if (!line) throw new Error('the sample lost its lines');
    const measured = { quantity: '3.60', unit: 'm²', rule: 'girth by length', measures: [] };
    const widget = await open('members', { lines: [{ ...line, measured }] });
    expect(widget.element.querySelector('.note')?.textContent).toMatch(
      /3\.60? m².*girth by length|girth by length.*3\.60? m²/,
    );
  });

  it('and the measures a quantity is the sum of', async () => {
    const [line] = clientPrice(6_150_00).lines;
    const values = (count: number, length_mm: number) => ({ count, length_mm, girth_mm: 80 });
    const measures = [
      { code: 'paid-plain' as const, values: values(3, 1200) },
      { code: 'paid-plain' as const, values: values(1, 450) },
    ];
    const measured = { quantity: '0.324', unit: 'm²', rule: 'as measured', measures };
    const widget = await open('members', { lines: [{ ...line, measured }] });
    expect(spoken(widget.element.querySelector('.note') as Element)).toBe(
      '0.324 m², by the rule: as measured (3 × 1200 mm by 80 mm; 450 mm by 80 mm)',
    );
  });
});

describe('ClientPayments', () => {
  it('names each payment in its order, a stage by the name it was given', async () => {
    const payment = { share_percent: null, work_minor: 0, recovered_minor: 0, retained_minor: 0 };
    const widget = await OpenedWidget.open(ClientPayments, {
      inputs: {
        payments: [
          { ...payment, of: 'deposit', name: '', paid_minor: 2_460_00 },
          { ...payment, of: 'stage', name: 'Delivered', paid_minor: 3_382_50 },
          { ...payment, of: 'first-release', name: '', paid_minor: 307_50 },
        ],
      },
      roles: ['owner'],
    });
    expect([...widget.element.querySelectorAll('dl > div')].map(spoken)).toEqual([
      expect.stringMatching(/^Deposit, on acceptance ?€2,460.00$/),
      expect.stringMatching(/^Delivered ?€3,382.50$/),
      expect.stringMatching(/^First half of what is held back, on completion ?€307.50$/),
    ]);
  });
});
