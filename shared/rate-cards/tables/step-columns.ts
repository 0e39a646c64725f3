import {
  cautionNames,
  climateModels,
  holdPoints,
  layerColours,
  missedWindows,
  stepKinds,
} from '#shared/buildups/buildup';
import { choicesOf } from '#shared/rate-cards/tables/choices-of';
import type { CardColumn } from '#shared/rate-cards/tables/card-table';
import {
  choiceColumn,
  gradeColumn,
  itemColumn,
  nameColumn,
  noteColumn,
  numberColumn,
  yesNoColumn,
} from '#shared/rate-cards/tables/columns';

const minutes = { unit: 'minutes' } as const;
const openMinutes = { unit: 'minutes', empty: 'null' } as const;
const workWays = ['area', 'laying', 'consolidating', 'cleaning', 'recutting', 'edge', 'waiting'] as const;

const workColumns: readonly CardColumn[] = [
  choiceColumn('work.way', 'work', { choices: choicesOf('work', workWays) }),
  numberColumn('work.hours_m2', 'work-hours', { unit: 'hours', empty: 'absent' }),
  choiceColumn('work.factors', 'work-factors', {
    choices: choicesOf('work-factors', ['finish', 'smoothing', 'none']),
    empty: 'absent',
  }),
  choiceColumn('work.part', 'work-part', {
    choices: choicesOf('laying-part', ['first', 'faulting', 'second']),
    empty: 'absent',
  }),
];

const dryingColumns: readonly CardColumn[] = [
  choiceColumn('drying.model', 'dries', { choices: choicesOf('climate', climateModels) }),
  numberColumn('drying.betweenCoats_minutes.low', 'between-low', minutes),
  numberColumn('drying.betweenCoats_minutes.likely', 'between-likely', minutes),
  numberColumn('drying.betweenCoats_minutes.high', 'between-high', minutes),
  numberColumn('drying.latestCoat_minutes', 'latest-coat', openMinutes),
  numberColumn('drying.beforeNext_minutes.low', 'before-low', minutes),
  numberColumn('drying.beforeNext_minutes.likely', 'before-likely', minutes),
  numberColumn('drying.beforeNext_minutes.high', 'before-high', minutes),
  numberColumn('drying.window_minutes', 'window', openMinutes),
  yesNoColumn('drying.endsInWindow', 'ends-in-window'),
  numberColumn('drying.wholeWithin_minutes', 'whole-within', openMinutes),
  choiceColumn('drying.missed', 'missed', { choices: choicesOf('missed', missedWindows), empty: 'null' }),
];

/** One step of a build-up. */
export const stepColumns: readonly CardColumn[] = [
  nameColumn,
  choiceColumn('kind', 'step-kind', { choices: choicesOf('step', stepKinds) }),
  numberColumn('coats.plain', 'coats-plain'),
  numberColumn('coats.moulded', 'coats-moulded'),
  numberColumn('coats.carved', 'coats-carved'),
  numberColumn('coats.recut', 'coats-recut'),
  numberColumn('coats.frenchRecut', 'coats-french'),
  choiceColumn('areaPart', 'goes-on', { choices: choicesOf('part-of-zone', ['all', 'burnished', 'matte']) }),
  ...workColumns,
  gradeColumn(),
  ...dryingColumns,
  numberColumn('groundPerCoat_mm', 'ground', { unit: 'mm' }),
  choiceColumn('cautions', 'cautions', { choices: choicesOf('caution', cautionNames), several: true }),
  choiceColumn('holds', 'holds', { choices: choicesOf('hold', holdPoints), several: true }),
  yesNoColumn('optional', 'optional'),
  choiceColumn('colour', 'colour', { choices: choicesOf('colour', layerColours) }),
  noteColumn,
];

/** What a coat of a step takes of a material or recipe. */
export const useColumns: readonly CardColumn[] = [
  choiceColumn('of', 'use-of', { choices: choicesOf('use-of', ['material', 'recipe']) }),
  itemColumn('itemId', 'use-item', { items: 'material-or-recipe' }),
  choiceColumn('way', 'use-way', { choices: choicesOf('use-way', ['grams', 'coverage', 'litres']) }),
  numberColumn('grams_m2', 'use-grams', { empty: 'absent' }),
  numberColumn('coverage_m2_L', 'use-coverage', { empty: 'absent' }),
  numberColumn('litres_m2', 'use-litres', { empty: 'absent' }),
  numberColumn('loss_percent', 'loss', { unit: 'percent' }),
  numberColumn('share', 'use-share'),
];

/** A wait from a step to one further on. */
export const lagColumns: readonly CardColumn[] = [
  itemColumn('toStepId', 'to-step', { items: 'later-step' }),
  numberColumn('least_minutes', 'least', openMinutes),
  numberColumn('finishedWithin_minutes', 'finished-within', openMinutes),
];
