import * as z from 'zod';
import type { EstimateProfit, EstimateSettings } from '#shared/estimates/settings';
import type { DecimalText } from '#shared/money/decimal';
import { marginOfMarkUp, markUpOfMargin } from '#shared/money/margin';
import { complainAt, decimalEntry, decimalPercentEntry } from '#shared/problems/card-entry-schema';
import { complain } from '#shared/problems/complaints-of';
import type { Entries } from '../../core/forms/schema-controls';

const belowHundred = decimalEntry.refine((text) => Number(text) < 100, complain('entry-not-below', { maximum: 100 }));

const choices = {
  profit: z.enum(['card', 'margin', 'mark-up', 'lump-sum']),
  profit_percent: z.string(),
  lumpSum: z.string(),
  contingency: z.enum(['card', 'share', 'risk']),
  contingency_percent: z.string(),
  discount: z.enum(['none', 'percent', 'amount']),
  discountAmount: z.string(),
  taxCategoryId: z.string().min(1),
};

type Choices = z.infer<z.ZodObject<typeof choices>>;

function profitFigure({ profit }: Choices): (readonly [keyof Choices, z.ZodType])[] {
  if (profit === 'card') return [];
  if (profit === 'lump-sum') return [['lumpSum', decimalEntry]];
  return [['profit_percent', profit === 'margin' ? belowHundred : decimalEntry]];
}

/** Which figure is asked for by what was chosen, and what it has to be. */
function askedFigures(entries: Choices): [keyof Choices, z.ZodType][] {
  const { contingency, discount } = entries;
  return [
    ...profitFigure(entries),
    ...(contingency === 'share' ? [['contingency_percent', decimalPercentEntry] as const] : []),
    ...(discount === 'none'
      ? []
      : [['discountAmount', discount === 'percent' ? decimalPercentEntry : decimalEntry] as const]),
  ].map(([path, schema]) => [path, schema]);
}

/** What is entered of profit, contingency, discount and tax; `card` follows the rate card. A figure not asked for may be anything. */
export const profitFormSchema = z.strictObject(choices).superRefine((entries, context) => {
  for (const [path, schema] of askedFigures(entries)) {
    if (entries[path] === '') complainAt(context, [path], complain('entry-missing'));
    else schema.safeParse(entries[path]).error?.issues.forEach((issue) => context.addIssue({ ...issue, path: [path] }));
  }
});

export type ProfitEntries = Entries<typeof profitFormSchema>;
type ProfitSettings = Pick<EstimateSettings, 'profit' | 'contingency' | 'discount' | 'taxCategoryId'>;

export const noProfitEntries: ProfitEntries = {
  profit: 'card',
  profit_percent: '',
  lumpSum: '',
  contingency: 'card',
  contingency_percent: '',
  discount: 'none',
  discountAmount: '',
  taxCategoryId: '',
};

/** The settings as the form shows them. */
export const profitEntriesOf = ({ profit, contingency, discount, taxCategoryId }: ProfitSettings): ProfitEntries => ({
  profit: profit?.way ?? 'card',
  profit_percent: profit && profit.way !== 'lump-sum' ? profit.percent : '',
  lumpSum: profit?.way === 'lump-sum' ? profit.amount : '',
  contingency: contingency?.way ?? 'card',
  contingency_percent: contingency?.way === 'share' ? contingency.percent : '',
  discount: discount?.way ?? 'none',
  discountAmount: discount?.amount ?? '',
  taxCategoryId,
});

function profitSetting({ profit, profit_percent, lumpSum }: Choices): EstimateProfit | null {
  if (profit === 'card') return null;
  return profit === 'lump-sum' ? { way: profit, amount: lumpSum } : { way: profit, percent: profit_percent };
}

/** What was entered as the settings keep it. */
export function profitSettingsOf(entries: Choices): ProfitSettings {
  const { contingency, discount } = entries;
  return {
    profit: profitSetting(entries),
    contingency:
      contingency === 'card'
        ? null
        : { way: contingency, percent: contingency === 'share' ? entries.contingency_percent : '0' },
    discount: discount === 'none' ? null : { way: discount, amount: entries.discountAmount },
    taxCategoryId: entries.taxCategoryId,
  };
}

/** The same profit said the other way, to two decimals, so that changing the way moves the price by next to nothing. */
export function profitSaidAs(way: 'margin' | 'mark-up', from: { way: string; percent: DecimalText }): DecimalText {
  if (from.way === way) return from.percent;
  const said = way === 'margin' ? marginOfMarkUp(from.percent) : markUpOfMargin(from.percent);
  return said.toDecimalPlaces(2).toFixed();
}
