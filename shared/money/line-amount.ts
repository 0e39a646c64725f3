import { D, type DecimalText, type MinorUnits } from '#shared/money/decimal';
import { exactMinor } from '#shared/money/minor-of';
import { roundMinor } from '#shared/money/round-minor';

/** A quantity at a price, the price being for `baseQuantity` of them (1 when left out). */
export interface PricedQuantity {
  readonly quantity: DecimalText;
  readonly price: DecimalText;
  readonly baseQuantity?: DecimalText;
}

/** quantity × price ÷ base quantity, half up to the whole minor unit (EN 16931, net amount of a line, Peppol R120). */
export const lineAmount = (line: PricedQuantity, digits: number): MinorUnits =>
  roundMinor(
    exactMinor(line.price, digits)
      .times(line.quantity)
      .div(new D(line.baseQuantity ?? '1')),
  );
