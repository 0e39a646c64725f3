import type { DecimalText, MinorUnits } from '#shared/money/decimal';
import type { TaxRate } from '#shared/money/tax-by-category';
import type { UnitCode } from '#shared/invoices/unit-code';

/**
 * Something taken off or put on: a fixed amount, or a percentage of a base (EN 16931: base and percent come together or not at all).
 * Amounts are never negative; `reasonCode` is of UNTDID 5189 (taken off) or 7161 (put on).
 */
export interface AllowanceOrCharge {
  readonly charge: boolean;
  readonly reason: string;
  readonly reasonCode: string | null;
  readonly amount:
    | { readonly way: 'fixed'; readonly amount_minor: MinorUnits }
    | { readonly way: 'percent'; readonly base_minor: MinorUnits; readonly percent: DecimalText };
}

/** One line of an invoice or credit note: a quantity at a net price (for `baseQuantity` of them), what comes off and on, and its tax. */
export interface InvoiceLine {
  readonly id: string;
  readonly name: string;
  readonly description: string;
  readonly quantity: DecimalText;
  readonly unit: UnitCode;
  /** Decimal amount of currency, never negative: a reduction is a negative quantity, an allowance or a credit note (BR-27). */
  readonly price: DecimalText;
  readonly baseQuantity: DecimalText;
  readonly allowancesCharges: readonly AllowanceOrCharge[];
  readonly tax: TaxRate;
}

/** What comes off or on the document as a whole, under the tax it belongs to. */
export interface DocumentAllowanceOrCharge extends AllowanceOrCharge {
  readonly tax: TaxRate;
}
