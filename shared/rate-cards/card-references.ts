import type { RateCard } from '#shared/rate-cards/rate-card';

/** A place of a card that names an item of another list of it. */
export interface CardReference {
  readonly kind: 'grade' | 'leaf' | 'timber';
  readonly path: readonly (string | number)[];
  readonly itemId: string;
}

const grade = (itemId: string, ...path: (string | number)[]): CardReference => ({ kind: 'grade', path, itemId });

function carvingReferences({ carving }: RateCard): CardReference[] {
  return [
    ...carving.stages.map((stage, at) => grade(stage.gradeId, 'carving', 'stages', at, 'gradeId')),
    ...carving.items.map((item, at) => grade(item.gradeId, 'carving', 'items', at, 'gradeId')),
    grade(carving.undercuttingGradeId, 'carving', 'undercuttingGradeId'),
    grade(carving.patternGradeId, 'carving', 'patternGradeId'),
    grade(carving.recutting.gradeId, 'carving', 'recutting', 'gradeId'),
  ];
}

const stepReferences = ({ buildUps }: RateCard): CardReference[] =>
  buildUps.buildUps.flatMap(({ steps }, at) =>
    steps.map((step, stepAt) => grade(step.gradeId, 'buildUps', 'buildUps', at, 'steps', stepAt, 'gradeId')),
  );

function moneyReferences({ money: { extras, making } }: RateCard): CardReference[] {
  return [
    ...(['sampleBoard', 'packing', 'fitting', 'touchingIn'] as const).map((extra) =>
      grade(extras[extra].gradeId, 'money', 'extras', extra, 'gradeId'),
    ),
    grade(making.joineryGradeId, 'money', 'making', 'joineryGradeId'),
    grade(making.turningGradeId, 'money', 'making', 'turningGradeId'),
    {
      kind: 'leaf',
      path: ['money', 'extras', 'sampleBoard', 'leafProductId'],
      itemId: extras.sampleBoard.leafProductId,
    },
    ...making.timbers.map(({ timberId }, at): CardReference => ({
      kind: 'timber',
      path: ['money', 'making', 'timbers', at, 'timberId'],
      itemId: timberId,
    })),
  ];
}

/** Every place of a card that names a grade, a leaf or a timber of another part of it, with its path. */
export const cardReferences = (card: RateCard): CardReference[] => [
  ...carvingReferences(card),
  ...stepReferences(card),
  ...moneyReferences(card),
];
