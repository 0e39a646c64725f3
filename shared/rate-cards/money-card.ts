import type { DecimalText } from '#shared/money/decimal';
import type { TaxCode } from '#shared/money/tax-codes';

/** A grade of hand: what an hour of theirs costs the workshop. */
export interface Grade {
  readonly id: string;
  readonly name: string;
  readonly costPerHour: DecimalText;
}

export interface TaxCategory {
  readonly id: string;
  readonly name: string;
  readonly code: TaxCode;
  readonly percent: DecimalText;
  readonly exemptionReason: string;
}

/** Overhead by the direct hour, or as a share of labour cost. */
export type Overhead =
  | { readonly way: 'per-hour'; readonly perHour: DecimalText }
  | { readonly way: 'share-of-labour'; readonly percent: DecimalText };

/** Contingency as a share of direct cost, or from risk at a percentile; both are kept, `way` says which is in force. */
export interface Contingency {
  readonly way: 'share' | 'risk';
  readonly percent: DecimalText;
  readonly percentile: number;
  readonly distribution: 'triangular' | 'pert';
  readonly commonFactor: number;
}

/** Profit on price (margin, below 100 %) or on cost (mark-up). */
export interface Profit {
  readonly way: 'margin' | 'mark-up';
  readonly percent: DecimalText;
}

/** What a job needs besides carving and gilding. Hours decimal, prices in the workshop's currency. */
export interface Extras {
  readonly sampleBoard: {
    readonly hours: number;
    readonly gradeId: string;
    readonly booklets: number;
    readonly leafProductId: string;
  };
  readonly packing: { readonly hours: number; readonly gradeId: string; readonly crate: DecimalText };
  readonly fitting: { readonly people: number; readonly hours: number; readonly gradeId: string };
  readonly touchingIn: { readonly hours: number; readonly gradeId: string };
  readonly insurance_percent: DecimalText;
}

/** Timber for making, by timber of the carving card. */
export interface TimberPrice {
  readonly id: string;
  readonly timberId: string;
  readonly name: string;
  readonly pricePerDm3: DecimalText;
}

/** Making a base: timber bought with its waste, and joinery and turning by the hour. */
export interface Making {
  readonly timbers: readonly TimberPrice[];
  readonly waste_percent: number;
  readonly joineryGradeId: string;
  readonly turningGradeId: string;
}

/** One stage of the default plan of payment, in percent of the contract. */
export interface PaymentStage {
  readonly id: string;
  readonly name: string;
  readonly percent: DecimalText;
}

/** How contracts are usually paid: a deposit recovered pro rata, a retention released in two halves, the stages between (100 % together). */
export interface PaymentTerms {
  readonly deposit_percent: DecimalText;
  readonly retention_percent: DecimalText;
  readonly stages: readonly PaymentStage[];
}

/** The part of a rate card that turns hours and quantities into a price. */
export interface MoneyCard {
  readonly grades: readonly Grade[];
  readonly overhead: Overhead;
  readonly contingency: Contingency;
  readonly profit: Profit;
  readonly consumables_percent: DecimalText;
  readonly taxCategories: readonly TaxCategory[];
  readonly defaultTaxCategoryId: string;
  readonly extras: Extras;
  readonly making: Making;
  readonly terms: PaymentTerms;
  readonly leafPricesHold_days: number;
  /** The currency the workshop had when the card was last changed (ISO 4217); absent on a card nobody changed since it was planted. */
  readonly currency?: string | undefined;
}
