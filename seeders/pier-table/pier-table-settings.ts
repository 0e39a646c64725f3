import { v7 as newId } from 'uuid';
import type { Alternative, EstimateSettings } from '#shared/estimates/settings';
import { extraEntry } from '../entries/extra-entry';

const joinery = { kind: 'labour', gradeId: 'carver', work: 'making' } as const;

const extras = () => [
  extraEntry({
    kind: 'timber',
    name: 'Lime for legs, aprons and stretcher',
    volume_dm3: 56,
    price_per_dm3: '2.40',
    waste_percent: 40,
  }),
  extraEntry({ ...joinery, name: 'Joinery: back legs, blocks, aprons, dry fitting of the marble', hours: 20 }),
  extraEntry({ ...joinery, name: 'Turning: urn and feet', hours: 4 }),
  extraEntry({
    kind: 'labour',
    name: 'Sample board, burnished beside matte',
    gradeId: 'gilder',
    hours: 4,
    work: 'sample',
  }),
  extraEntry({ kind: 'bought-in', name: 'Leaf for the sample board, one booklet', cost: '52.00' }),
  extraEntry({ kind: 'labour', name: 'Packing', gradeId: 'improver', hours: 5, work: 'packing' }),
  extraEntry({ kind: 'bought-in', name: 'Crate', cost: '160.00' }),
  extraEntry({ kind: 'bought-in', name: 'Carriage to Ardnamara House', cost: '290.00' }),
  extraEntry({
    kind: 'labour',
    name: 'Fitting, two people, with touching in',
    gradeId: 'gilder',
    hours: 8,
    work: 'fitting',
  }),
  extraEntry({ kind: 'insurance', name: 'Insurance in our care', percent: '0.4', value: null }),
];

/** What is agreed about the pier-table base as a whole. */
export const pierTableSettings = (alternatives: readonly Alternative[]): Partial<EstimateSettings> => ({
  introduction:
    'A new base to stand below the second marble, carved in lime to the pattern of the first and water gilt, burnished on the highs and matte in the hollows.',
  extras: extras(),
  alternatives,
  stages: {
    deposit_percent: 30,
    parts: [
      { id: newId(), name: 'Carving approved', percent: 40 },
      { id: newId(), name: 'Gilding finished', percent: 40 },
      { id: newId(), name: 'Delivered and fitted', percent: 20 },
    ],
    retention_percent: 5,
  },
  included: 'Full-size drawing; clay model of the shell; one sample board; delivery and fitting on the ground floor.',
  excluded: 'The marble and its fixing to the wall; any repair of the first table.',
  seed: 1_807,
});
