import { unitCodes, type UnitCode } from '#shared/invoices/unit-code';

const names: Readonly<Record<UnitCode, string>> = {
  C62: $localize`one`,
  H87: $localize`piece`,
  EA: $localize`each`,
  SET: $localize`set`,
  HUR: $localize`hour`,
  LH: $localize`labour hour`,
  MIN: $localize`minute`,
  DAY: $localize`day`,
  WEE: $localize`week`,
  MTK: $localize`m²`,
  MTR: $localize`m`,
  CMK: $localize`cm²`,
  FTK: $localize`ft²`,
  FOT: $localize`ft`,
  LTR: $localize`litre`,
  KGM: $localize`kg`,
  GRM: $localize`g`,
  KMT: $localize`km`,
  LS: $localize`lump sum`,
  D63: $localize`booklet`,
  P1: $localize`percent`,
  DMQ: $localize`dm³`,
  MTQ: $localize`m³`,
};

/** What a line may be counted in. */
export const unitChoices = unitCodes.map((value) => ({ value, label: names[value] }));
