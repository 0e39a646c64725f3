import type { Finding } from '#shared/words/finding';

const codes: readonly Finding['code'][] = ['drying-too-damp', 'drying-too-cold', 'drying-factor-clipped'];

/** Whether a finding speaks of the air of the shop, and so stands beside its entries. */
export const isOfAir = ({ code }: Finding): boolean => codes.includes(code);
