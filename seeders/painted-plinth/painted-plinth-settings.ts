import { v7 as newId } from 'uuid';
import type { EstimateSettings, ExtraLine } from '#shared/estimates/settings';
import { alternativeEntry } from '../entries/alternative-entry';
import { extraEntry } from '../entries/extra-entry';

const extras = (secondSampleId: string): ExtraLine[] => [
  extraEntry({
    kind: 'timber',
    name: 'Poplar for the skins and formers',
    volume_dm3: 34,
    price_per_dm3: '1.50',
    waste_percent: 60,
  }),
  extraEntry({ kind: 'labour', name: 'Bending and joinery', gradeId: 'carver', hours: 32, work: 'making' }),
  extraEntry({
    kind: 'labour',
    name: 'Sample of the glazes, one stretch',
    gradeId: 'finisher',
    hours: 6,
    work: 'sample',
  }),
  extraEntry(
    { kind: 'labour', name: 'Second sample, on a blue ground', gradeId: 'finisher', hours: 6, work: 'sample' },
    { alternativeId: secondSampleId },
  ),
  extraEntry({ kind: 'bought-in', name: 'Photographs of the engravings, to scale', cost: '145.00' }),
  extraEntry({ kind: 'labour', name: 'Packing', gradeId: 'improver', hours: 5, work: 'packing' }),
  extraEntry({ kind: 'bought-in', name: 'Carriage to the museum', cost: '210.00' }),
  extraEntry({ kind: 'labour', name: 'Fitting and touching in', gradeId: 'gilder', hours: 6, work: 'fitting' }),
  extraEntry({ kind: 'insurance', name: 'Insurance in our care', percent: '0.4', value: null }),
];

/** What is agreed about the painted plinth as a whole. */
export function paintedPlinthSettings(): Partial<EstimateSettings> {
  const secondSample = alternativeEntry('A second sample of the glazes', {
    note: 'The same flowers over a blue ground, so that the two can be seen beside the clock.',
  });
  return {
    introduction:
      'A half-round plinth below the musical clock: flowers in transparent glazes over white, between mouldings gilt in water above and on oil below.',
    site: { temperature_celsius: 20, humidity_percent: 50 },
    extras: extras(secondSample.id),
    alternatives: [secondSample],
    stages: {
      deposit_percent: 25,
      parts: [
        { id: newId(), name: 'Carcase and mouldings ready', percent: 35 },
        { id: newId(), name: 'Gilding finished', percent: 30 },
        { id: newId(), name: 'Painted and fitted', percent: 35 },
      ],
      retention_percent: 5,
    },
    included: 'One sample of the glazes; the three medallions after your engravings.',
    excluded: 'The clock and its moving; lighting.',
    seed: 90_311,
  };
}
