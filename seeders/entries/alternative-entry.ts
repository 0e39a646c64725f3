import { v7 as newId } from 'uuid';
import type { Alternative } from '#shared/estimates/settings';

/** Another way of doing part of the work; it stands by itself unless it is put in a group. */
export const alternativeEntry = (name: string, given: Partial<Omit<Alternative, 'id' | 'name'>>): Alternative => ({
  id: newId(),
  name,
  group: '',
  note: '',
  replaces: [],
  ...given,
});
