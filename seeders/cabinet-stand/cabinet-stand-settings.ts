import { v7 as newId } from 'uuid';
import type { Alternative, EstimateSettings, ExtraLine } from '#shared/estimates/settings';
import { alternativeEntry } from '../entries/alternative-entry';
import { extraEntry } from '../entries/extra-entry';

const making = { kind: 'labour', gradeId: 'carver', work: 'making' } as const;

/** Fitting by the client's own people instead of ours. */
function fitting(): { extra: ExtraLine; alternative: Alternative } {
  const ours = extraEntry({
    kind: 'labour',
    name: 'Fitting below the cabinet, two people',
    gradeId: 'gilder',
    hours: 8,
    work: 'fitting',
  });
  const alternative = alternativeEntry('Without fitting', {
    note: 'The cabinet is lifted on by the client’s own people; we lend the felt and the drawing.',
    replaces: [ours.id],
  });
  return { extra: ours, alternative };
}

const extras = (): ExtraLine[] => [
  extraEntry({ kind: 'timber', name: 'Lime for the frame', volume_dm3: 24, price_per_dm3: '2.40', waste_percent: 40 }),
  extraEntry({
    kind: 'timber',
    name: 'Beech for legs and stretchers',
    volume_dm3: 18,
    price_per_dm3: '1.40',
    waste_percent: 40,
  }),
  extraEntry({ ...making, name: 'Joinery of the frame', hours: 22 }),
  extraEntry({ ...making, name: 'Turning of legs, feet, rings and balls', hours: 19 }),
  extraEntry({
    kind: 'labour',
    name: 'Sample board, gold beside toned silver',
    gradeId: 'gilder',
    hours: 5,
    work: 'sample',
  }),
  extraEntry({
    kind: 'paid-quantity',
    name: 'Steel straps let into the frame',
    rule: 'As measured',
    quantity: '2.4',
    unit: 'm',
    price: '38.50',
  }),
  extraEntry({ kind: 'labour', name: 'Packing', gradeId: 'improver', hours: 6, work: 'packing' }),
  extraEntry({ kind: 'bought-in', name: 'Crate', cost: '180.00' }),
  extraEntry({ kind: 'bought-in', name: 'Carriage', cost: '260.00' }),
  extraEntry({
    kind: 'insurance',
    name: 'Insurance of the cabinet while it is measured with us',
    percent: '0.4',
    value: '18000.00',
  }),
];

/** What is agreed about the cabinet stand as a whole. */
export function cabinetStandSettings(alternatives: readonly Alternative[]): Partial<EstimateSettings> {
  const { extra, alternative } = fitting();
  return {
    introduction:
      'A stand for the lacquer cabinet: turned and twisted, gilt on oil size, its beads and rosettes in silver, sealed and toned to a pale gold.',
    presentation: 'kinds',
    extras: [...extras(), extra],
    alternatives: [...alternatives, alternative],
    discount: { way: 'percent', amount: '3' },
    stages: {
      deposit_percent: 40,
      parts: [
        { id: newId(), name: 'Frame dry fitted below the cabinet', percent: 50 },
        { id: newId(), name: 'Delivered', percent: 50 },
      ],
      retention_percent: 0,
    },
    included: 'One sample board; one visit to dry fit the frame.',
    excluded: 'Lifting of the cabinet; any work on its lacquer or its hinges.',
    seed: 52_660,
  };
}
