import { learningModels } from '#shared/carving/carving-card';
import { carvingItemKinds, ornamentWays } from '#shared/carving/ornament';
import { reliefs } from '#shared/measure/relief';
import { choicesOf } from '#shared/rate-cards/tables/choices-of';
import type { CardPart } from '#shared/rate-cards/tables/card-table';
import {
  choiceColumn,
  gradeColumn,
  hundredthsColumn,
  itemColumn,
  nameColumn,
  numberColumn,
  yesNoColumn,
} from '#shared/rate-cards/tables/columns';

const wayColumn = choiceColumn('way', 'counted', { choices: choicesOf('way', ornamentWays) });
const hoursColumns = [
  numberColumn('hours.low', 'hours-low', { unit: 'hours' }),
  numberColumn('hours.likely', 'hours-likely', { unit: 'hours' }),
  numberColumn('hours.high', 'hours-high', { unit: 'hours' }),
];

/** The ornament a workshop carves, and how hours grow with size and fall with repetition. */
export const ornamentsPart: CardPart = {
  id: 'ornaments',
  heading: 'card-part-ornaments',
  tables: [
    {
      kind: 'list',
      id: 'ornaments',
      heading: 'card-table-ornaments',
      place: 'carving.ornaments',
      hasIds: true,
      columns: [
        nameColumn,
        wayColumn,
        numberColumn('reference_mm', 'reference', { unit: 'mm' }),
        choiceColumn('relief', 'relief', { choices: choicesOf('relief', reliefs) }),
        ...hoursColumns,
        numberColumn('patternHours.low', 'pattern-low', { unit: 'hours' }),
        numberColumn('patternHours.likely', 'pattern-likely', { unit: 'hours' }),
        numberColumn('patternHours.high', 'pattern-high', { unit: 'hours' }),
        yesNoColumn('isRunning', 'running'),
      ],
    },
    {
      kind: 'list',
      id: 'items',
      heading: 'card-table-items',
      place: 'carving.items',
      hasIds: true,
      columns: [
        nameColumn,
        choiceColumn('kind', 'item-kind', { choices: choicesOf('item', carvingItemKinds) }),
        wayColumn,
        numberColumn('reference_mm', 'reference', { unit: 'mm', empty: 'null' }),
        ...hoursColumns,
        gradeColumn(),
      ],
    },
    {
      kind: 'form',
      id: 'carving',
      heading: 'card-table-carving',
      columns: [
        numberColumn('carving.sizeExponent', 'size-exponent'),
        choiceColumn('carving.learning.model', 'learning-model', { choices: choicesOf('learning', learningModels) }),
        numberColumn('carving.learning.rate_percent', 'learning-rate', { unit: 'percent' }),
        numberColumn('carving.learning.plateauPieces', 'plateau-pieces'),
        numberColumn('carving.learning.plateauRunning', 'plateau-running'),
        numberColumn('carving.stretchTolerance_percent', 'stretch', { unit: 'percent' }),
        numberColumn('carving.undercut_percent', 'undercut', { unit: 'percent' }),
        itemColumn('carving.undercuttingGradeId', 'undercutting-grade', { items: 'grade' }),
        itemColumn('carving.patternGradeId', 'pattern-grade', { items: 'grade' }),
      ],
    },
    {
      kind: 'list',
      id: 'stages',
      heading: 'card-table-stages',
      place: 'carving.stages',
      hasIds: true,
      columns: [nameColumn, hundredthsColumn('share_hundredths', 'share'), gradeColumn()],
    },
  ],
};
