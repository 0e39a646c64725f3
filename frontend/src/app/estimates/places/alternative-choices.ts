import type { EstimateSettings } from '#shared/estimates/settings';
import type { EntryChoice } from '../../ui/field/entry-at';

/** The base and every alternative something may belong to; the base alone where there is none. */
export const alternativeChoices = (settings: Pick<EstimateSettings, 'alternatives'> | undefined): EntryChoice[] => [
  { value: null, label: $localize`the base` },
  ...(settings?.alternatives ?? []).map(({ id, name }) => ({ value: id, label: name })),
];
