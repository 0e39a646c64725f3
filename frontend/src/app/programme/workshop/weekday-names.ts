/** From Monday to Sunday. */
export const weekdayNames: readonly string[] = [
  $localize`Monday`,
  $localize`Tuesday`,
  $localize`Wednesday`,
  $localize`Thursday`,
  $localize`Friday`,
  $localize`Saturday`,
  $localize`Sunday`,
];
