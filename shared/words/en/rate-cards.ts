export const rateCards = {
  'tax-rate-misfit': 'A standard rate is above nought; nothing else but a regional tax charges one.',
  'tax-reason-misfit':
    'An exempt category says why nothing is charged, as the law words it; a taxed or zero-rated one leaves this empty.',
  'terms-stages-not-whole': 'The stages have to come to exactly 100 % of the contract.',
  'terms-withheld-over': 'Deposit and retention together cannot be more than the contract.',
  'card-grade-unknown': 'The rate card has no such grade of labour.',
  'card-leaf-unknown': 'The rate card has no such leaf.',
  'card-timber-unknown': 'The rate card has no such timber.',
  'rate-card-none-in-force': 'No rate card is in force today.',
  'history-rate-card-planted': 'The start rate card was put in force',
} as const;
