import type { StandInSession } from './stand-in-ledger';

const escaped = (text: string): string =>
  text.replace(/&/g, '&amp;').replace(/</g, '&lt;').replace(/>/g, '&gt;').replace(/"/g, '&quot;');

const style =
  'body{font:1.1rem/1.5 sans-serif;max-width:32rem;margin:3rem auto;padding:0 1rem}button{font:inherit;padding:.6rem 1.2rem;margin-right:1rem}';

const form = `<form method="post">
<button name="answer" value="pay">Pay</button>
<button name="answer" value="leave">Leave without paying</button>
</form>`;

/** The page a payer is sent to; it says itself that it is none of a payment service, and asks for no card. */
export function payOrLeave({ title, amount_total, currency, status }: StandInSession): string {
  const amount = `${amount_total} ${escaped(currency.toUpperCase())} (smallest units)`;
  const rest = status === 'open' ? form : '<p>This payment is over. You may close the page.</p>';
  return `<!doctype html><html lang="en"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width"><title>Payment, standing in</title><style>${style}</style></head>
<body><main><h1>Standing in for the payment page</h1>
<p>No payment service is connected here, so no money moves and no card is asked for.</p>
<p>${escaped(title)}</p><p>${amount}</p>${rest}</main></body></html>`;
}
