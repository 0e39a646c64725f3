import { D } from '#shared/money/decimal';
import { settled } from '#shared/money/settled';

/**
 * A floating-point quantity as the decimal that enters money: settled, then 6 decimals half up. Any unit (hours, dm³, leaves);
 * RangeError when it is not finite.
 */
export const exactFigure = (quantity: number): D => new D(String(settled(quantity))).toDecimalPlaces(6);
