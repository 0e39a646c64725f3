import type { ExtraLine } from '#shared/estimates/settings';
import type { UsualExtra } from './usual-extras';

/** How the buttons that add a usual line are called. */
export const usualExtraNames: Readonly<Record<UsualExtra, string>> = {
  sample: $localize`Sample board`,
  packing: $localize`Packing and crate`,
  transport: $localize`Transport`,
  fitting: $localize`Fitting on site`,
  'touching-in': $localize`Touching in`,
  insurance: $localize`Insurance in care`,
  timber: $localize`Timber`,
  joinery: $localize`Joinery`,
  turning: $localize`Turning`,
  hours: $localize`Work by the hour`,
  'bought-in': $localize`Bought in`,
  'paid-quantity': $localize`Measured work`,
  price: $localize`A price of its own`,
};

/** What an hour of a further line is for. */
export const workNames: Readonly<Record<Extract<ExtraLine, { kind: 'labour' }>['work'], string>> = {
  making: $localize`Making`,
  sample: $localize`Sample boards`,
  packing: $localize`Packing`,
  fitting: $localize`Fitting on site`,
  other: $localize`Other work`,
};

/** How a further line is worked. */
export const extraKindNames: Readonly<Record<ExtraLine['kind'], string>> = {
  labour: $localize`by the hour`,
  'bought-in': $localize`bought in`,
  timber: $localize`timber and waste`,
  'paid-quantity': $localize`measured`,
  insurance: $localize`insurance`,
  price: $localize`price`,
};
