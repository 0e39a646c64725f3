import { v7 as newId } from 'uuid';
import type { ExtraLine } from '#shared/estimates/settings';

/** A union, each part of it without some fields. */
type Without<T, Key extends PropertyKey> = T extends unknown ? Omit<T, Key> : never;

type AnyExtra = Pick<ExtraLine, 'id' | 'taxCategoryId' | 'memberId' | 'alternativeId'>;

/** A further line of an estimate, of the job as a whole and at the standard rate, unless something else is said. */
export const extraEntry = (line: Without<ExtraLine, keyof AnyExtra>, more: Partial<AnyExtra> = {}): ExtraLine => ({
  id: newId(),
  taxCategoryId: 'standard',
  memberId: null,
  alternativeId: null,
  ...line,
  ...more,
});
