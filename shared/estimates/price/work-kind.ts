/** What a line of a price is for, in the order lines are written; clients see these names, never the cost behind them. */
export const workKinds = [
  'making',
  'carving',
  'ground',
  'gilding',
  'finishing',
  'restoring',
  'sample',
  'packing',
  'fitting',
  'bought-in',
  'paid-quantity',
  'insurance',
  'other',
] as const;
export type WorkKind = (typeof workKinds)[number];

/** What money is spent on, on the cost side. */
export const costHeads = ['labour', 'leaf', 'materials', 'consumables', 'timber', 'bought-in', 'insurance'] as const;
export type CostHead = (typeof costHeads)[number];
