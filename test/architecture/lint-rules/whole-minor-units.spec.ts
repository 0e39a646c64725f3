import { ruleTester } from './rule-tester';
import { wholeMinorUnits } from './whole-minor-units';

const fraction = [{ messageId: 'fraction' }];
const float = [{ messageId: 'float' }];

ruleTester.run('whole-minor-units', wholeMinorUnits, {
  valid: [
    { name: 'a sum', code: 'const total_minor = net_minor + tax_minor;' },
    { name: 'a whole count of a price', code: 'const total_minor = count * price_minor;' },
    { name: 'the share of one amount in another', code: 'const share = part_minor / total_minor;' },
    {
      name: 'the decimal arithmetic',
      code: 'const tax_minor = new D(net_minor).times(rate).toDecimalPlaces(0).toNumber();',
    },
    { name: 'lengths may be divided', code: 'const half_mm = length_mm / 2;' },
    { name: 'the larger of two', code: 'const due_minor = Math.max(0, open_minor);' },
  ],
  invalid: [
    { name: 'a half', code: 'const half = net_minor / 2;', errors: fraction },
    { name: 'a share by a fraction', code: 'const tax = invoice.net_minor * 0.2;', errors: fraction },
    { name: 'a fraction of it', code: 'const tax = 0.2 * net_minor;', errors: fraction },
    { name: 'a rounded float', code: 'const tax_minor = Math.round(net * rate);', errors: float },
    { name: 'a text read as a float', code: 'line.price_minor = parseFloat(text);', errors: float },
    { name: 'a quotient in an object', code: 'const line = { price_minor: price / count };', errors: float },
  ],
});
