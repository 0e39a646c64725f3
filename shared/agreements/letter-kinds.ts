/** What a workshop writes to its clients by itself, each in words of its own if it likes. */
export const letterKinds = [
  'estimate',
  'variation',
  'answer',
  'accepted',
  'sign-in',
  'invoice',
  'credit-note',
  'receipt',
  'reminder',
  'statement',
] as const;
export type LetterKind = (typeof letterKinds)[number];

/** What may stand in braces in the letters of every kind. */
const everywhere = ['client', 'workshop'] as const;
const ofJob = [...everywhere, 'job', 'link'] as const;
const ofEstimate = [...ofJob, 'number', 'total'] as const;
const ofInvoice = [...ofEstimate, 'day', 'open', 'note'] as const;

/** The placeholders each kind of letter knows; whatever else stands in braces is refused. */
export const letterPlaceholders: Readonly<Record<LetterKind, readonly string[]>> = {
  estimate: [...ofEstimate, 'day', 'note'],
  variation: [...ofEstimate, 'day', 'note'],
  answer: [...ofJob, 'text'],
  accepted: [...everywhere, 'job', 'number', 'total'],
  'sign-in': [...everywhere, 'link'],
  invoice: ofInvoice,
  'credit-note': ofInvoice,
  receipt: [...ofEstimate, 'day', 'open'],
  reminder: ofInvoice,
  statement: [...everywhere, 'link', 'day', 'open', 'note'],
};

/** What a letter of a kind is of no use without. */
export const neededPlaceholders: Readonly<Record<LetterKind, readonly string[]>> = {
  estimate: ['link'],
  variation: ['link'],
  answer: ['text'],
  accepted: [],
  'sign-in': ['link'],
  invoice: [],
  'credit-note': [],
  receipt: [],
  reminder: [],
  statement: [],
};
