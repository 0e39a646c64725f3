import type { Formats } from './formats';

interface Price {
  readonly gross_minor: number;
  readonly tax_minor: number;
}

/** What something comes to, said to be with tax where there is some. */
export function grossText(formats: Formats, { gross_minor, tax_minor }: Price): string {
  const gross = formats.money(gross_minor);
  return tax_minor === 0 ? gross : $localize`${gross}:gross: with tax`;
}

/** A price without and with its tax, once where there is none; no text as long as it is not known. */
export function netAndGrossText(formats: Formats, price?: Price & { readonly net_minor: number }): string {
  if (!price) return '';
  const net = formats.money(price.net_minor);
  return price.tax_minor === 0
    ? $localize`${net}:net:, no tax`
    : $localize`${net}:net: net, ${grossText(formats, price)}:gross:`;
}
