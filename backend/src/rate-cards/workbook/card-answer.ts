import { Rejection } from '#shared/problems/rejection';
import type { RateCard } from '#shared/rate-cards/rate-card';
import { readCardWorkbook } from './read-card-workbook';

/** What is asked of the thread that reads workbooks; the bytes arrive there as a plain array. */
export interface CardQuestion {
  readonly bytes: Uint8Array;
  readonly currency: string;
}

/** The card of a workbook, or its refusal in parts, since an error loses its class on its way out of a thread. */
export type CardAnswer = { readonly card: RateCard } | { readonly refusal: Pick<Rejection, 'kind' | 'code' | 'more'> };

export async function cardAnswer({ bytes, currency }: CardQuestion): Promise<CardAnswer> {
  try {
    return { card: await readCardWorkbook(Buffer.from(bytes), currency) };
  } catch (error) {
    if (!(error instanceof Rejection)) throw error;
    const { kind, code, more } = error;
    return { refusal: { kind, code, more } };
  }
}
